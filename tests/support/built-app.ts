import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

const BUILT = process.env.WEB_DIST ?? 'dist';
const SCRIPTS = '_expo/static/js/web';

/** The address of the database worker's script in the built app. */
export function workerAddress(): string {
  const name = readdirSync(path.join(BUILT, SCRIPTS)).find((file) =>
    /^sqlite-worker-.*\.js$/.test(file),
  );
  if (!name) throw new Error('the build has no database worker');
  return `/${SCRIPTS}/${name}`;
}

/** A copy of the built app whose database worker begins with other words. */
export function copyApp(workerBegins: string): { folder: string; remove: () => void } {
  const folder = mkdtempSync(path.join(tmpdir(), 'dist-'));
  cpSync(BUILT, folder, { recursive: true, filter: (file) => !/\.(br|gz)$/.test(file) });
  const worker = path.join(folder, workerAddress());
  writeFileSync(worker, `${workerBegins}\n${readFileSync(worker, 'utf8')}`);
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
