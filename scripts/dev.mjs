// npm run dev: the server, restarted on every change, and the app with live reload, each at an
// address of its own (the app needs no server so far).
import path from 'node:path';

import { startChild } from './setup/child.mjs';
import { openDatabase } from './setup/database.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';
import { ROOT } from './setup/paths.mjs';
import { findFreePort } from './setup/ports.mjs';
import { SetupError } from './setup/say.mjs';

async function develop() {
  await installPackages();
  const apiPort = String(await findFreePort(3100));
  const webPort = String(await findFreePort(8081));
  const env = { ...process.env, ...(await openDatabase()) };
  const options = { cwd: ROOT, stdio: ['ignore', 'inherit', 'inherit'], env };
  const register = ['-r', '@swc-node/register'];
  const swc = { SWC_NODE_PROJECT: 'tsconfig.server.json', PORT: apiPort, WEB_DIST: 'public' };
  const api = startChild(
    process.execPath,
    ['--watch', '--watch-path=server', '--watch-path=shared', ...register, 'server/index.ts'],
    { ...options, env: { ...env, ...swc } },
  );
  const expo = path.join(ROOT, 'node_modules/expo/bin/cli');
  const web = startChild(process.execPath, [expo, 'start', '--web', '--port', webPort], {
    ...options,
    env: { ...env, EXPO_NO_TELEMETRY: '1' },
  });
  console.log(
    `App with live reload: http://127.0.0.1:${webPort} · API: http://127.0.0.1:${apiPort}`,
  );
  const code = await Promise.race([api.ended, web.ended]);
  throw new SetupError(`One of the two ended (${code}).`);
}

await main(develop, () => 0);
