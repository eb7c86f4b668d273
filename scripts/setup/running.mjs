import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { withLock } from './lock.mjs';
import { DATA } from './paths.mjs';
import { isAlive, SELF } from './process-identity.mjs';
import { onShutdown } from './shutdown.mjs';

const FILE = path.join(DATA, 'running.json');

/**
 * One `npm start` a folder. @returns `null` when we are the one; else the one there is,
 * `{ identity, url }`, without a url while it still sets up
 */
export function claimStart() {
  mkdirSync(DATA, { recursive: true });
  return withLock(`${FILE}.lock`, async () => {
    const other = existsSync(FILE) ? JSON.parse(readFileSync(FILE, 'utf8')) : null;
    if (other && isAlive(other.identity)) return other;
    note({});
    onShutdown(() => rmSync(FILE, { force: true }));
    return null;
  });
}

/** Tells others where we serve. */
export function noteAddress(url) {
  note({ url });
}

function note(more) {
  writeFileSync(FILE, JSON.stringify({ identity: SELF, ...more }));
}
