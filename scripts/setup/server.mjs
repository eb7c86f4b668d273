import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

import { startChild } from './child.mjs';
import { ROOT } from './paths.mjs';
import { SetupError } from './say.mjs';

const GUARD = path.join(ROOT, 'scripts/setup/end-with-parent.mjs');

/**
 * Starts the built server and waits until it answers. It ends with this process, however this
 * process ends.
 *
 * @returns a promise of its exit code
 */
export async function startServer(folder, port, env) {
  const entry = path.join(folder, 'server/index.js');
  const { child, ended } = startChild(
    process.execPath,
    ['--enable-source-maps', '--import', GUARD, entry],
    {
      cwd: ROOT,
      env: {
        NODE_ENV: 'production',
        LOG_LEVEL: 'warn',
        ...process.env,
        ...env,
        PORT: String(port),
      },
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
      detached: true, // Ctrl-C comes to us first, and we stop it before its database
    },
  );
  await untilItAnswers(`http://127.0.0.1:${port}/api/health`, child);
  return { ended };
}

async function untilItAnswers(address, child) {
  for (let attempt = 0; attempt < 300; attempt += 1) {
    if (child.exitCode !== null) throw new SetupError('The server ended while it started.');
    const answer = await fetch(address).catch(() => null);
    if (answer?.ok) return;
    await sleep(100);
  }
  throw new SetupError(`The server did not answer at ${address} within 30 s.`);
}
