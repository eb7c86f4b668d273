import { startChild } from './child.mjs';
import { buildServer, buildWeb } from './builds.mjs';
import { bringChromium } from './chromium.mjs';
import { openRunDatabase } from './database.mjs';
import { ROOT } from './paths.mjs';
import { findFreePort } from './ports.mjs';

/** What tests/support needs to serve the built product to Chromium, as environment variables. */
export async function prepareBuiltApp() {
  return {
    CHROMIUM: await bringChromium(),
    WEB_DIST: process.env.WEB_DIST ?? (await buildWeb()),
    SERVER_DIST: process.env.SERVER_DIST ?? (await buildServer()),
    E2E_PORT: String(await findFreePort(3570, 2)),
    ...(await openRunDatabase()),
  };
}

/** Runs a TypeScript file of the tests outside jest. @returns its exit code or signal */
export function runTypeScript(file, env) {
  const { ended } = startChild(process.execPath, ['-r', '@swc-node/register', file], {
    cwd: ROOT,
    env: { ...process.env, SWC_NODE_PROJECT: 'tsconfig.server.json', ...env },
    stdio: 'inherit',
  });
  return ended;
}
