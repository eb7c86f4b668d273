import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

import { isAlive, SELF } from './process-identity.mjs';

const OURS = Symbol('ours');

/**
 * Runs `job` while no other process holds the lock file. A lock whose holder has died is taken
 * over. `onWait` is called once with the holder's process id if there is a wait.
 */
export async function withLock(file, job, onWait = () => undefined) {
  mkdirSync(path.dirname(file), { recursive: true });
  for (let waited = false; ; waited = true) {
    const holder = tryLock(file);
    if (holder === OURS) break;
    if (!waited && holder) onWait(holder.split('-')[0]);
    await sleep(100);
  }
  try {
    return await job();
  } finally {
    rmSync(file, { force: true });
  }
}

/** @returns OURS if we got it, else the identity that holds it, `null` if that just changed */
function tryLock(file) {
  const mine = `${file}.${SELF}`;
  writeFileSync(mine, SELF);
  try {
    linkSync(mine, file); // made whole or not at all, and fails when there is one
    return OURS;
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
    return removeIfDead(file);
  } finally {
    rmSync(mine, { force: true });
  }
}

function removeIfDead(file) {
  const holder = read(file);
  if (!holder || isAlive(holder)) return holder;
  const aside = `${file}.dead.${SELF}`;
  try {
    renameSync(file, aside);
    const moved = read(aside);
    if (moved && isAlive(moved)) linkSync(aside, file); // somebody was quicker: give it back
  } catch {
    // taken over by another process at the same moment
  }
  rmSync(aside, { force: true });
  return null;
}

function read(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null;
  }
}
