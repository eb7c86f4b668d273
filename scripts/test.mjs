// npm test [-- jest's arguments]: all set-up, then every test in one run of jest.
// The last line is "N passed, N failed", alone.
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';

import { buildServer, buildWeb } from './setup/builds.mjs';
import { startChild } from './setup/child.mjs';
import { bringChromium } from './setup/chromium.mjs';
import { openRunDatabase } from './setup/database.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';
import { CACHE, ROOT } from './setup/paths.mjs';
import { findFreePort } from './setup/ports.mjs';
import { say } from './setup/say.mjs';
import { onShutdown, shutDown } from './setup/shutdown.mjs';

const args = process.argv.slice(2);
const RESULTS = path.join(CACHE, `test-results-${process.pid}.json`);

async function test() {
  await installPackages();
  const env = { ...process.env, ...(wants('e2e') ? await prepareBrowserTests() : {}) };
  if (!env.DATABASE_URL && (wants('e2e') || wants('server'))) {
    say('Starting a database for the tests …');
    Object.assign(env, await openRunDatabase());
  }
  const code = await jest(env);
  const { passed, failed } = count(code);
  await shutDown(); // nothing may be written after the last line
  console.log(`${passed} passed, ${failed} failed`);
  return failed > 0 || passed === 0 ? 1 : 0;
}

/** Only some projects were asked for: do not build for the others. */
function wants(project) {
  const at = args.indexOf('--selectProjects');
  if (at < 0) return true;
  const rest = args.slice(at + 1);
  const end = rest.findIndex((it) => it.startsWith('-'));
  return rest.slice(0, end < 0 ? undefined : end).includes(project);
}

async function prepareBrowserTests() {
  const CHROMIUM = await bringChromium();
  const [WEB_DIST, SERVER_DIST] = [await buildWeb(), await buildServer()];
  const E2E_PORT = String(await findFreePort(3470, 8)); // and one for each of jest's workers
  return { CHROMIUM, WEB_DIST, SERVER_DIST, E2E_PORT };
}

function jest(env) {
  mkdirSync(CACHE, { recursive: true });
  onShutdown(() => rmSync(RESULTS, { force: true }));
  const program = path.join(ROOT, 'node_modules/jest/bin/jest.js');
  const ours = ['--json', `--outputFile=${RESULTS}`];
  const { ended } = startChild(process.execPath, [program, ...ours, ...args], {
    cwd: ROOT,
    env,
    detached: true, // with its workers
    stdio: ['ignore', 'ignore', 'inherit'], // --json repeats all of the results on stdout
  });
  return ended;
}

/** A file that could not run counts as one failure, and so does a jest that fails without one. */
function count(code) {
  const results = readResults();
  const passed = results?.numPassedTests ?? 0;
  const failed = (results?.numFailedTests ?? 0) + (results?.numRuntimeErrorTestSuites ?? 0);
  return { passed, failed: code === 0 ? failed : Math.max(failed, 1) };
}

function readResults() {
  try {
    return JSON.parse(readFileSync(RESULTS, 'utf8'));
  } catch {
    return null;
  }
}

await main(test, () => 130);
