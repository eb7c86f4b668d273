import { randomBytes } from 'node:crypto';
import { chownSync, existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { clusterHome } from './cluster-home.mjs';
import { livingLeases, releaseLease, takeLease } from './leases.mjs';
import { withLock } from './lock.mjs';
import { DATA } from './paths.mjs';
import { findFreePort } from './ports.mjs';
import { bringPostgres } from './postgres-programs.mjs';
import { postgresUser } from './run-as.mjs';
import { run } from './run.mjs';
import { SetupError } from './say.mjs';
import { onShutdown } from './shutdown.mjs';

export const SUPERUSER = 'matside_superuser';
/** Owns the tables and migrates them. */
export const OWNER = 'matside';
/** The server's: reads and writes rows, held back by row-level security. */
export const APP = 'matside_app';
const ROLES = [SUPERUSER, OWNER, APP];
const SETTINGS = `
# Matside's own cluster: loopback only, no socket files, passwords checked with SCRAM.
listen_addresses = '127.0.0.1'
unix_socket_directories = ''
password_encryption = 'scram-sha-256'
max_connections = 100
shared_buffers = 64MB
fsync = on
`;

/**
 * Starts the project's own PostgreSQL cluster of that name, or joins it when it runs already.
 * At the shutdown of the last process that uses it, it stops.
 *
 * @param name folder under .data: "postgres", or "postgres-test" for tests
 * @param firstPort where the search for a free port begins
 * @returns the port, and the passwords by role
 */
export async function joinCluster(name, firstPort) {
  const cluster = await locate(name);
  const lock = path.join(cluster.folder, 'lock');
  const users = path.join(cluster.folder, 'users');
  onShutdown(() => leave(cluster, lock, users));
  return withLock(lock, async () => {
    takeLease(users);
    if (!existsSync(path.join(cluster.data, 'PG_VERSION'))) await create(cluster);
    const port = (await isRunning(cluster)) ? portOf(cluster) : await start(cluster, firstPort);
    return { port, passwords: JSON.parse(readFileSync(cluster.passwordFile, 'utf8')) };
  });
}

/** Stops the cluster unless another living process still uses it. */
function leave(cluster, lock, users) {
  return withLock(lock, async () => {
    releaseLease(users);
    if (livingLeases(users).length > 0 || !(await isRunning(cluster))) return;
    await control(cluster, ['-m', 'fast', '-w', 'stop'], { whileStopping: true });
  });
}

async function locate(name) {
  const folder = path.join(DATA, name);
  const programs = await bringPostgres(); // makes the user too, where Debian installs it
  const user = postgresUser();
  const home = clusterHome(folder, user);
  return {
    folder,
    user,
    home,
    data: path.join(home, 'cluster'),
    passwordFile: path.join(home, 'passwords.json'),
    programs,
  };
}

async function create(cluster) {
  const { user, data, home, passwordFile } = cluster;
  rmSync(data, { recursive: true, force: true }); // what an interrupted creation left
  mkdirSync(data, { mode: 0o700 });
  const passwords = Object.fromEntries(ROLES.map((it) => [it, randomBytes(24).toString('hex')]));
  const handover = path.join(home, 'initial-password'); // initdb reads it as its own user
  writeFileSync(passwordFile, JSON.stringify(passwords), { mode: 0o600 });
  writeFileSync(handover, passwords[SUPERUSER], { mode: 0o600 });
  if (user.uid !== undefined) for (const it of [data, handover]) chownSync(it, user.uid, user.gid);
  try {
    const how = ['--auth=scram-sha-256', '--encoding=UTF8', '--locale=C.UTF-8'];
    const who = [`--username=${SUPERUSER}`, `--pwfile=${handover}`];
    await run(cluster.programs.path('initdb'), ['-D', data, ...who, ...how], as(cluster));
    const file = path.join(data, 'postgresql.conf');
    writeFileSync(file, readFileSync(file, 'utf8') + SETTINGS);
  } catch (error) {
    rmSync(data, { recursive: true, force: true });
    throw error;
  } finally {
    rmSync(handover, { force: true });
  }
}

async function start(cluster, firstPort) {
  for (let first = firstPort; ;) {
    const port = await findFreePort(first);
    const log = path.join(cluster.data, 'server.log');
    const options = ['-l', log, '-o', `-p ${port}`, '-w', '-t', '60', 'start'];
    const { code } = await control(cluster, options, { mayFail: true });
    if (code === 0) return port;
    const lastWords = existsSync(log) ? readFileSync(log, 'utf8').slice(-2000) : '';
    if (!/could not bind|Address already in use/.test(lastWords) || port > firstPort + 50) {
      throw new SetupError(`PostgreSQL did not start. The end of ${log}:\n${lastWords}`);
    }
    first = port + 1; // taken between our look and PostgreSQL's
  }
}

async function isRunning(cluster) {
  const { code } = await control(cluster, ['status'], { mayFail: true, whileStopping: true });
  return code === 0;
}

function portOf(cluster) {
  const lines = readFileSync(path.join(cluster.data, 'postmaster.pid'), 'utf8').split('\n');
  return Number(lines[3]);
}

function control(cluster, args, { mayFail = false, whileStopping = false } = {}) {
  // no pipes: the server would inherit them and keep them open
  const how = { ...as(cluster), mayFail, output: 'none', finish: true, whileStopping };
  return run(cluster.programs.path('pg_ctl'), ['-D', cluster.data, ...args], how);
}

/** In its own folder: PostgreSQL's programs complain when they cannot enter the current one. */
function as({ user, data, programs }) {
  return { ...user, cwd: data, env: { ...process.env, ...programs.env, HOME: data } };
}
