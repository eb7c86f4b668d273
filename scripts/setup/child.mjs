import { spawn } from 'node:child_process';

import { onShutdown } from './shutdown.mjs';

const PATIENCE_MS = 15_000;

/**
 * Starts a program that runs along with this process and is stopped at its shutdown; when it is
 * `detached`, in a process group of its own, all that it started too.
 * @returns the child, and a promise of its exit code, signal, or why it could not begin
 */
export function startChild(command, args, options) {
  const child = spawn(command, args, options);
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (code, signal) => resolve(code ?? signal));
  });
  onShutdown(async () => {
    const hasEnded = child.exitCode !== null || child.signalCode !== null;
    if (!hasEnded) signal(child, options.detached, 'SIGTERM');
    const late = setTimeout(() => signal(child, options.detached, 'SIGKILL'), PATIENCE_MS);
    await ended;
    clearTimeout(late);
  });
  return { child, ended };
}

function signal(child, group, name) {
  try {
    process.kill(group ? -child.pid : child.pid, name);
  } catch {
    // it has just ended, or never began
  }
}
