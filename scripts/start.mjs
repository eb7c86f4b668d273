// npm start: all set-up, then Matside on 127.0.0.1 until Ctrl-C.
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { buildServer, buildWeb } from './setup/builds.mjs';
import { openDatabase } from './setup/database.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';
import { DATA, ROOT } from './setup/paths.mjs';
import { findFreePort, isFree } from './setup/ports.mjs';
import { run } from './setup/run.mjs';
import { claimStart, noteAddress } from './setup/running.mjs';
import { say, SetupError } from './setup/say.mjs';
import { startServer } from './setup/server.mjs';

const USUAL_PORT = 3000;
let serving = false;

async function start() {
  const other = await claimStart();
  if (other) return tellWhere(other);
  await choosePort(); // a port that was asked for and is taken is told before the long work
  await installPackages();
  const web = await buildWeb();
  const server = await buildServer();
  say('Starting the database …');
  const env = { ...(await openDatabase()), WEB_DIST: web };
  await migrateAndSeed(server, env);
  const port = await choosePort();
  if (!process.env.PORT && port !== USUAL_PORT) say(`Port ${USUAL_PORT} is taken: using ${port}.`);
  const { ended } = await startServer(server, port, env);
  const url = `http://127.0.0.1:${port}`;
  noteAddress(url);
  serving = true;
  console.log(`
Matside is ready: ${url}
No sign-in yet: open the address and choose Open the example.
Ctrl-C stops the server and its database; what you saved stays.`);
  const code = await ended;
  throw new SetupError(`The server ended by itself (${code}).`);
}

/** Once for each server build and database: the stamp lies beside the database, and goes with it. */
async function migrateAndSeed(server, env) {
  const stamp = path.join(DATA, 'postgres', 'prepared-by');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === server) return;
  await run(process.execPath, [path.join(server, 'server/seed.js')], {
    cwd: ROOT,
    env: { ...process.env, ...env },
  });
  writeFileSync(stamp, server);
}

async function choosePort() {
  if (process.env.PORT) {
    const asked = Number(process.env.PORT);
    if (!Number.isInteger(asked) || asked < 1 || asked > 65_535) {
      throw new SetupError(`PORT must be a number from 1 to 65535, not "${process.env.PORT}".`);
    }
    if (await isFree(asked)) return asked;
    throw new SetupError(`Port ${asked} is taken. Choose another: PORT=${asked + 1} npm start`);
  }
  return findFreePort(USUAL_PORT);
}

function tellWhere({ identity, url }) {
  const [pid] = identity.split('-');
  if (url) console.log(`Matside already runs from this folder: ${url} (process ${pid}).`);
  else console.log(`Another npm start is setting up in this folder (process ${pid}): see there.`);
  return 0;
}

await main(start, (signal) => (serving && signal !== 'SIGHUP' ? 0 : 130));
