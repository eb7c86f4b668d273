import { spawn } from 'node:child_process';

import { SetupError } from './say.mjs';

const running = new Set();
let closed = false;

/**
 * Runs a program to its end, in a process group of its own, so that Ctrl-C reaches it through
 * `stopRunning` and not halfway.
 *
 * @param options spawn's, and: `output` 'none' (default: kept, and told on failure);
 *   `mayFail`: a code other than 0 is returned, not thrown; `finish`: never interrupted;
 *   `whileStopping`: allowed to begin after `stopRunning`
 * @returns exit code and what it wrote
 */
export function run(command, args, options = {}) {
  const { output = 'keep', mayFail, finish, whileStopping, ...spawnOptions } = options;
  if (closed && !whileStopping) return Promise.reject(new SetupError('Stopped.'));
  const stdio = { none: 'ignore', keep: 'pipe' }[output];
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      ...spawnOptions,
      detached: true,
      stdio: ['ignore', stdio, stdio],
    });
    const entry = { child, finish, ended: new Promise((end) => child.once('close', end)) };
    running.add(entry);
    let text = '';
    for (const stream of [child.stdout, child.stderr]) stream?.on('data', (it) => (text += it));
    const done = (code) => {
      running.delete(entry);
      if (code === 0 || mayFail) resolve({ code, text });
      else reject(new SetupError(`${command} ${args.join(' ')}\nended with ${code}.\n${text}`));
    };
    child.once('error', (error) => {
      text += error.message;
      done(127);
    });
    child.once('close', (code, signal) => done(code ?? signal));
  });
}

/** Ends what `run` has running, waits for what must finish, and lets nothing new begin. */
export async function stopRunning(onWait = () => undefined) {
  closed = true;
  const entries = [...running];
  if (entries.some(({ finish }) => finish)) onWait();
  for (const { child, finish } of entries) if (!finish) signalGroup(child, 'SIGTERM');
  await Promise.all(entries.map(({ ended }) => ended));
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // it has ended already, or never began
  }
}
