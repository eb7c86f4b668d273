// npm run bench [-- web|plan]: what must be fast, measured on the built product. A table for each
// part; the exit code is 1 when a target is missed. BENCH_TAPS, BENCH_TAPS_BEFORE and BENCH_STARTS
// make it shorter. Measure on a machine that has nothing else to do.
import { prepareBuiltApp, runTypeScript } from './setup/built-app.mjs';
import { main } from './setup/main.mjs';
import { installPackages } from './setup/packages.mjs';
import { SetupError } from './setup/say.mjs';

const PARTS = {
  plan: () => runTypeScript('tests/bench/plan-times.ts', {}),
  web: async () => runTypeScript('tests/bench/web-times.ts', await prepareBuiltApp()),
};

async function bench() {
  const asked = process.argv.slice(2);
  const unknown = asked.find((part) => !(part in PARTS));
  if (unknown) throw new SetupError(`no part ${unknown}: ${Object.keys(PARTS).join(', ')}`);
  await installPackages();
  let missed = 0;
  for (const [name, run] of Object.entries(PARTS)) {
    if (asked.length > 0 && !asked.includes(name)) continue;
    if ((await run()) !== 0) missed += 1;
  }
  return missed > 0 ? 1 : 0;
}

await main(bench, () => 130);
