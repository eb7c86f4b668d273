import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { canEnter } from './run-as.mjs';
import { say } from './say.mjs';

const ELSEWHERE = '/var/lib/matside';

/**
 * Where a cluster's files lie: in the project's folder, or, when root's clone is closed to the
 * user that PostgreSQL runs as (a clone in /root), in a folder under /var/lib/matside. Each of
 * the two then names the other, and one whose project is gone is cleared away.
 */
export function clusterHome(folder, user) {
  mkdirSync(folder, { recursive: true });
  if (canEnter(user, folder)) return folder;
  const pointer = path.join(folder, 'moved-to');
  clearAbandoned();
  const known = read(pointer);
  if (known && existsSync(known)) return known;
  const home = path.join(ELSEWHERE, randomBytes(6).toString('hex'));
  mkdirSync(home, { recursive: true });
  writeFileSync(path.join(home, 'belongs-to'), `${folder}\n`);
  writeFileSync(pointer, `${home}\n`);
  say(`PostgreSQL's files go to ${home}: its user cannot enter ${folder}.`);
  return home;
}

function clearAbandoned() {
  if (!existsSync(ELSEWHERE)) return;
  for (const name of readdirSync(ELSEWHERE)) {
    const home = path.join(ELSEWHERE, name);
    const owner = read(path.join(home, 'belongs-to'));
    const inUse = existsSync(path.join(home, 'cluster/postmaster.pid'));
    if (owner && !inUse && read(path.join(owner, 'moved-to')) !== home) {
      rmSync(home, { recursive: true, force: true });
    }
  }
}

function read(file) {
  try {
    return readFileSync(file, 'utf8').trim();
  } catch {
    return null;
  }
}
