import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';

import { bring, UNPACKED, unpackedEnv } from './debian.mjs';
import { run } from './run.mjs';

const OLDEST = 15;

/**
 * The newest PostgreSQL, 15 or later: the system's, the one unpacked into the project, or else
 * brought from Debian. MATSIDE_POSTGRES_HOME stands in for /usr/lib/postgresql.
 * @returns `path(program)` and the environment that the programs need
 */
export function bringPostgres() {
  return bring({ name: 'postgresql', look, choose });
}

function look() {
  const system = process.env.MATSIDE_POSTGRES_HOME ?? '/usr/lib/postgresql';
  return newest(system, {}) ?? newest(path.join(UNPACKED, 'usr/lib/postgresql'), unpackedEnv());
}

function newest(home, env) {
  if (!existsSync(home)) return null;
  const version = readdirSync(home)
    .map(Number)
    .filter((it) => it >= OLDEST && existsSync(path.join(home, `${it}/bin/initdb`)))
    .sort((a, b) => b - a)[0];
  if (!version) return null;
  return { env, path: (program) => path.join(home, `${version}/bin`, program) };
}

/** Debian has one PostgreSQL a release: postgresql-15 in 12, postgresql-17 in 13. */
async function choose(aptOptions) {
  const { text } = await run('apt-cache', [...aptOptions, 'pkgnames', 'postgresql-'], {
    mayFail: true,
  });
  const versions = [...text.matchAll(/^postgresql-(\d+)$/gm)].map(([, version]) => Number(version));
  const version = versions.filter((it) => it >= OLDEST).sort((a, b) => b - a)[0];
  return version ? `postgresql-${version}` : null;
}
