// Loaded before the server: when the process that started it is gone, even by kill -9, it stops.
process.on('disconnect', () => process.kill(process.pid, 'SIGTERM'));
process.channel?.unref();
