import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

import { livingLeases, releaseLease, takeLease } from './leases.mjs';
import { withLock } from './lock.mjs';
import { CACHE, ROOT } from './paths.mjs';
import { SELF } from './process-identity.mjs';
import { run } from './run.mjs';
import { say, SetupError } from './say.mjs';
import { onShutdown } from './shutdown.mjs';

const USERS = path.join(CACHE, 'packages-used-by');

/**
 * Installs what package-lock.json names when node_modules does not hold exactly that, and marks
 * it as used by this process. It never replaces packages that another process runs on.
 */
export function installPackages() {
  return withLock(path.join(CACHE, 'packages.lock'), async () => {
    if (!isInstalled()) {
      const others = livingLeases(USERS).filter((it) => it !== SELF);
      if (others.length > 0) throw new SetupError(inUse(others));
      say('Installing packages (about 30 s) …');
      await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { cwd: ROOT });
    }
    takeLease(USERS);
    onShutdown(() => releaseLease(USERS));
  });
}

/** npm writes down what it installed; a mark of our own would miss an `npm install` by hand. */
function isInstalled() {
  const installed = packagesIn('node_modules/.package-lock.json');
  const wanted = packagesIn('package-lock.json');
  if (!installed) return false;
  return Object.entries(wanted).every(([name, entry]) => {
    const there = installed[name];
    if (!there) return name === '' || entry.optional === true; // for other kinds of machine
    return there.version === entry.version && there.integrity === entry.integrity;
  });
}

function packagesIn(file) {
  const full = path.join(ROOT, file);
  return existsSync(full) ? JSON.parse(readFileSync(full, 'utf8')).packages : null;
}

function inUse(others) {
  const pids = others.map((it) => it.split('-')[0]).join(', ');
  return `package-lock.json has changed, but process ${pids} of this project runs on the packages
installed before. Stop it (Ctrl-C) and try again.`;
}
