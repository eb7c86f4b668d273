import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { isAlive, SELF } from './process-identity.mjs';

/** Says that this process uses what `folder` stands for, until it releases it or dies. */
export function takeLease(folder) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, SELF), '');
}

export function releaseLease(folder) {
  rmSync(path.join(folder, SELF), { force: true });
}

/** The identities of the living processes that hold a lease; what dead ones left is removed. */
export function livingLeases(folder) {
  let names;
  try {
    names = readdirSync(folder);
  } catch {
    return [];
  }
  for (const name of names) {
    if (!isAlive(name)) rmSync(path.join(folder, name), { force: true });
  }
  return names.filter(isAlive);
}
