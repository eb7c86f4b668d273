import { stopRunning } from './run.mjs';
import { say } from './say.mjs';

const cleanups = [];
let stopping = null;

/** Registers what undoes a start; the last registered is undone first. */
export function onShutdown(cleanup) {
  cleanups.push(cleanup);
}

export const isStopping = () => stopping !== null;

/** Stops all that this process started, once. A cleanup that fails does not keep the others. */
export function shutDown() {
  stopping ??= (async () => {
    await stopRunning(() => say('Letting what cannot be cut short finish first …'));
    for (const cleanup of cleanups.reverse()) {
      await Promise.resolve()
        .then(cleanup)
        .catch((error) => say(`While stopping: ${error.message}`));
    }
  })();
  return stopping;
}

/** Ctrl-C, and the ways a terminal or a supervisor ends a program. */
export function stopOnSignals(exitCode) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      void shutDown().then(() => process.exit(exitCode(signal)));
    });
  }
}
