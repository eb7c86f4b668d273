import {
  existsSync,
  mkdirSync,
  readdirSync,
  renameSync,
  rmSync,
  statSync,
  utimesSync,
} from 'node:fs';
import path from 'node:path';

import { hashInputs } from './hash-inputs.mjs';
import { livingLeases, releaseLease, takeLease } from './leases.mjs';
import { withLock } from './lock.mjs';
import { CACHE, ROOT } from './paths.mjs';
import { run } from './run.mjs';
import { say } from './say.mjs';
import { onShutdown } from './shutdown.mjs';

const KEPT = 3;
const COMMON = ['package.json', 'package-lock.json', 'scripts/setup/builds.mjs'];
const WEB = [
  ...['app', 'components', 'shared', 'sync', 'assets', 'public', 'app.json', 'global.d.ts'],
  ...['metro.config.js', 'babel.config.js', 'tsconfig.json', 'webpack.sw.config.cjs'],
  'scripts/precompress.mjs',
];
const SERVER = [
  ...['server', 'shared', 'sync/protocol', 'sync/merge'],
  ...['tsconfig.server.json', 'tsconfig.server.build.json'],
];

/** The web export with service worker and compressed files. @returns its folder */
export function buildWeb() {
  return cached('web', [...COMMON, ...WEB], async (folder, build) => {
    say('Building the app (about 40 s, or a few if little has changed) …');
    const env = {
      ...process.env,
      ...{ NODE_ENV: 'production', CI: '1', EXPO_NO_TELEMETRY: '1', EXPO_OFFLINE: '1' },
      EXPO_PUBLIC_BUILD: build, // by which open tabs know each other
      WEB_DIST: folder,
    };
    const tool = (name, ...args) =>
      run(process.execPath, [path.join(ROOT, 'node_modules/.bin', name), ...args], {
        cwd: ROOT,
        env,
      });
    await tool('expo', 'export', '--platform', 'web', '--output-dir', path.relative(ROOT, folder));
    await tool('webpack', '--config', 'webpack.sw.config.cjs');
    await run(process.execPath, ['scripts/precompress.mjs'], { cwd: ROOT, env });
  });
}

/** The server, compiled. @returns its folder; it starts from server/index.js there */
export function buildServer() {
  return cached('server', [...COMMON, ...SERVER], async (folder) => {
    say('Building the server (about 10 s) …');
    const tsc = path.join(ROOT, 'node_modules/typescript/bin/tsc');
    const args = ['-p', 'tsconfig.server.build.json', '--outDir', folder];
    await run(process.execPath, [tsc, ...args], { cwd: ROOT });
  });
}

/**
 * A build in a folder of its own, named by what went into it: nothing is ever written into a
 * build that somebody may be serving. This process keeps it from being cleared away.
 */
async function cached(kind, inputs, build) {
  const home = path.join(CACHE, kind);
  const name = hashInputs(inputs);
  const folder = path.join(home, name);
  await withLock(path.join(CACHE, `${kind}.lock`), async () => {
    takeLease(usersOf(folder));
    onShutdown(() => releaseLease(usersOf(folder)));
    if (!existsSync(folder)) {
      const partial = `${folder}.partial`;
      rmSync(partial, { recursive: true, force: true });
      mkdirSync(partial, { recursive: true });
      await build(partial, name);
      renameSync(partial, folder);
    }
    utimesSync(folder, new Date(), new Date());
    clearAway(home);
  });
  return folder;
}

const usersOf = (folder) => `${folder}.used-by`;

/** Keeps the newest few builds, and those that a living process uses; nothing half made. */
function clearAway(home) {
  for (const name of readdirSync(home).filter((it) => it.endsWith('.partial'))) {
    rmSync(path.join(home, name), { recursive: true, force: true });
  }
  const builds = readdirSync(home)
    .filter((name) => /^[0-9a-f]+$/.test(name))
    .map((name) => path.join(home, name))
    .sort((a, b) => statSync(b).mtimeMs - statSync(a).mtimeMs);
  for (const folder of builds.slice(KEPT)) {
    if (livingLeases(usersOf(folder)).length > 0) continue;
    for (const it of [folder, usersOf(folder)]) rmSync(it, { recursive: true, force: true });
  }
}
