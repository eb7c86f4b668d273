// npm run screens [-- --readme]: every screen with the example's data, at both sizes, in Day and
// Lamp, into .cache/screens; with --readme the four of README into assets/screenshots.
import path from 'node:path';

import { prepareBuiltApp, runTypeScript } from './setup/built-app.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';
import { CACHE, ROOT } from './setup/paths.mjs';

async function takeScreens() {
  await installPackages();
  const readme = process.argv.includes('--readme');
  const env = {
    ...(await prepareBuiltApp()),
    SCREENS: path.join(CACHE, 'screens'),
    ...(readme && { SCREENS_README: path.join(ROOT, 'assets/screenshots') }),
  };
  return (await runTypeScript('tests/screens/take-screens.ts', env)) === 0 ? 0 : 1;
}

await main(takeScreens, () => 130);
