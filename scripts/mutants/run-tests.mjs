import { spawn } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';

import { readVerdict } from './verdict.mjs';
import { configOf } from './tree.mjs';

const LONGEST_MS = 180_000;

/**
 * Runs tests of a tree.
 *
 * @param pattern of their paths
 * @param signal stops the run
 * @returns see readVerdict; `timed out` when it took too long
 */
export function runTests(tree, pattern, signal) {
  const output = path.join(tree, 'report.json');
  rmSync(output, { force: true });
  const jest = path.join(tree, 'node_modules/jest/bin/jest.js');
  const args = ['--config', configOf(tree), '--runInBand', '--json', `--outputFile=${output}`];
  const child = spawn(process.execPath, [jest, ...args, '--', pattern], {
    cwd: tree,
    stdio: 'ignore',
    signal: AbortSignal.any([signal, AbortSignal.timeout(LONGEST_MS)]),
    killSignal: 'SIGKILL',
  });
  return new Promise((resolve, reject) => {
    child.on('error', (error) => {
      if (error.name !== 'AbortError') reject(error);
    });
    child.on('close', () => {
      if (child.killed) resolve({ state: 'timed out', by: '' });
      else if (!existsSync(output)) resolve({ state: 'crashed', by: 'no report' });
      else resolve(readVerdict(JSON.parse(readFileSync(output, 'utf8'))));
    });
  });
}
