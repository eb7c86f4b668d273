import { spawn } from 'node:child_process';

import { SetupError } from './say.mjs';

const running = new Set();

/**
 * Runs a program to its end, in a process group of its own, so that Ctrl-C reaches it through
 * `stopRunning` and not halfway.
 *
 * @param options spawn's, and: `output` 'none' | 'show' (default: kept, and told on failure);
 *   `mayFail`: a code other than 0 is returned, not thrown; `finish`: never interrupted
 * @returns exit code and what it wrote
 */
export function run(command, args, options = {}) {
  const { output = 'keep', mayFail = false, finish = false, ...spawnOptions } = options;
  const stdio = { none: 'ignore', show: 'inherit', keep: 'pipe' }[output];
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

/** Ends what `run` has running, and waits; what must finish is waited for. */
export async function stopRunning(onWait = () => undefined) {
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
