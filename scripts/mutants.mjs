// npm run mutants: seeded errors in the arithmetic of shared/, each in a copy of it; every one must
// make a test fail by an assertion. Words after -- choose mutants by file.

import { computingFiles } from './mutants/computing-files.mjs';
import { MUTANTS } from './mutants/list.mjs';
import { runTests } from './mutants/run-tests.mjs';
import { countMatches, makeTree, removeTree, withMutant } from './mutants/tree.mjs';
import { ROOT } from './setup/paths.mjs';

const WORKERS = 2;
const ALL_TESTS = 'tests/shared/';
const chosen = process.argv.slice(2);
const mutants = MUTANTS.filter(
  ({ file }) => chosen.length === 0 || chosen.some((part) => file.includes(part)),
);
const stop = new AbortController();
const trees = [];

function fail(line) {
  console.error(line);
  process.exitCode = 1;
}

/** Files without a mutant, and mutants that fit nowhere or in two places. */
function checkList() {
  const seeded = new Set(MUTANTS.map(({ file }) => file));
  const files = computingFiles(ROOT);
  for (const file of files) if (!seeded.has(file)) fail(`NO MUTANT: ${file}`);
  for (const file of seeded) if (!files.includes(file)) fail(`NOT A COMPUTING FILE: ${file}`);
  for (const mutant of MUTANTS.filter(({ file }) => files.includes(file))) {
    const matches = countMatches(ROOT, mutant);
    if (matches !== 1) fail(`FOUND ${matches} TIMES: ${mutant.file}: ${mutant.find}`);
  }
}

/** The tests that the list names, one after the other; all of them only when those say nothing. */
async function tryMutant(tree, mutant) {
  return withMutant(tree, mutant, async () => {
    for (const tests of mutant.tests) {
      const verdict = await runTests(tree, tests, stop.signal);
      if (verdict.state === 'caught' || stop.signal.aborted) return verdict;
    }
    return runTests(tree, ALL_TESTS, stop.signal);
  });
}

/** What must not count as caught, or the verdicts would be worth nothing. */
async function tryControls(tree) {
  const file = 'shared/geometry/row-drift.ts';
  for (const replace of ['return null.value;', 'return throw;', 'return 2 * perEdgeIn;;;']) {
    const control = { file, find: 'return 2 * perEdgeIn * (pieces - 1);', replace };
    const { state } = await withMutant(tree, control, () =>
      runTests(tree, 'tests/shared/geometry/ring', stop.signal),
    );
    const wanted = replace.includes('perEdgeIn') ? 'caught' : 'crashed';
    if (state !== wanted && !stop.signal.aborted)
      fail(`CONTROL ${replace} ${state}, not ${wanted}`);
  }
}

async function work(tree, queue, results) {
  for (let mutant = queue.shift(); mutant; mutant = queue.shift()) {
    const verdict = await tryMutant(tree, mutant);
    if (stop.signal.aborted) return;
    const caught = verdict.state === 'caught';
    results.push(caught);
    const { file, find, replace } = mutant;
    const change = `${find} → ${replace}`.replace(/\s+/g, ' ');
    console.log(`${caught ? 'caught' : 'MISSED'}  ${file}\n        ${change}`);
    console.log(`        ${caught ? 'by' : verdict.state} ${verdict.by}`);
  }
}

async function main() {
  checkList();
  if (process.exitCode) return;
  trees.push(...Array.from({ length: WORKERS }, () => makeTree(ROOT)));
  const whole = await runTests(trees[0], ALL_TESTS, stop.signal);
  if (whole.state !== 'passed') return fail(`The tests fail without any mutant: ${whole.by}`);
  await tryControls(trees[0]);
  if (process.exitCode) return;
  const results = [];
  const queue = [...mutants];
  await Promise.all(trees.map((tree) => work(tree, queue, results)));
  if (stop.signal.aborted) return fail('Stopped.');
  const caught = results.filter(Boolean).length;
  console.log(`${computingFiles(ROOT).length} computing files, each with a mutant or more`);
  console.log(`${caught} caught, ${results.length - caught} missed`);
  if (caught < results.length) process.exitCode = 1;
}

for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => stop.abort());
try {
  await main();
} finally {
  trees.forEach(removeTree);
}
