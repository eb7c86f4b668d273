import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';

import { CACHE } from './paths.mjs';
import { SetupError } from './say.mjs';

const OLDEST = 15;
const UNPACKED = path.join(CACHE, 'debian');

/**
 * The newest PostgreSQL, 15 or later: the system's, or the one unpacked into the project.
 * @returns where its programs lie and the environment they need, or `null`
 */
export function lookForPostgres() {
  const system = process.env.MATSIDE_POSTGRES_HOME ?? '/usr/lib/postgresql';
  return newest(system, {}) ?? newest(path.join(UNPACKED, 'usr/lib/postgresql'), unpackedEnv());
}

export async function findPostgres() {
  const found = lookForPostgres();
  if (!found) throw new SetupError('PostgreSQL 15 or newer is missing.');
  return found;
}

function newest(home, env) {
  if (!existsSync(home)) return null;
  const versions = readdirSync(home)
    .map(Number)
    .filter((version) => version >= OLDEST)
    .filter((version) => existsSync(path.join(home, `${version}/bin/initdb`)))
    .sort((a, b) => b - a);
  if (versions.length === 0) return null;
  const bin = path.join(home, `${versions[0]}/bin`);
  return { version: versions[0], env, path: (program) => path.join(bin, program) };
}
