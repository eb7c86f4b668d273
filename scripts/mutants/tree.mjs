import { cpSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import path from 'node:path';

const COPIED = [
  'shared',
  'tests/shared',
  'tests/support',
  'tests/fixtures',
  '.swcrc',
  'package.json',
];
const CONFIG = 'jest.mutants.json';

/** A copy of the pure code and its tests, so that the work tree is never touched. */
export function makeTree(root) {
  const tree = mkdtempSync(path.join(tmpdir(), 'mutants-'));
  for (const part of COPIED) {
    cpSync(path.join(root, part), path.join(tree, part), { recursive: true });
  }
  symlinkSync(path.join(root, 'node_modules'), path.join(tree, 'node_modules'));
  writeFileSync(path.join(tree, CONFIG), JSON.stringify(sharedProject(root, tree)));
  return tree;
}

export function configOf(tree) {
  return path.join(tree, CONFIG);
}

/** The project "shared" of the one jest configuration, at home in a copy. */
function sharedProject(root, tree) {
  const { projects } = createRequire(import.meta.url)(path.join(root, 'jest.config.js'));
  const shared = projects.find(({ displayName }) => displayName === 'shared');
  return { ...shared, rootDir: tree, cacheDirectory: path.join(tree, '.jest-cache') };
}

/** Runs a job on the tree with one file's text replaced; the text comes back whatever happens. */
export async function withMutant(tree, { file, find, replace }, job) {
  const target = path.join(tree, file);
  const text = readFileSync(target, 'utf8');
  writeFileSync(
    target,
    text.replace(find, () => replace),
  );
  try {
    return await job();
  } finally {
    writeFileSync(target, text);
  }
}

export function removeTree(tree) {
  rmSync(tree, { recursive: true, force: true });
}

/** Times that a mutant's text stands in its file: it must be 1. */
export function countMatches(root, { file, find }) {
  return readFileSync(path.join(root, file), 'utf8').split(find).length - 1;
}
