import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

import { ROOT } from './paths.mjs';

/** A short name for the contents of these files and folders, and for the Node that builds them. */
export function hashInputs(inputs) {
  const hash = createHash('sha256').update(process.version);
  for (const file of inputs.flatMap(filesUnder).sort()) {
    hash.update(`\0${file}\0`).update(readFileSync(path.join(ROOT, file)));
  }
  return hash.digest('hex').slice(0, 16);
}

function filesUnder(input) {
  if (statSync(path.join(ROOT, input)).isFile()) return [input];
  return readdirSync(path.join(ROOT, input), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(ROOT, path.join(entry.parentPath, entry.name)));
}
