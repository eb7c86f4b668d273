import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

import type { Figure } from './report';

const KIB = 1024;

/** What the app weighs: as it is, and as it goes over the wire. */
export function bundleFigures(folder: string): Figure[] {
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' });
  const find = (pattern: RegExp): string => {
    const file = files.find((name) => pattern.test(name));
    if (!file) throw new Error(`no ${pattern} in ${folder}`);
    return path.join(folder, file);
  };
  const kib = (file: string) => statSync(file).size / KIB;
  const entry = find(/entry-[0-9a-f]+\.js$/);
  const wasm = find(/\.wasm$/);
  const precached = precache(folder);
  const sum = (sizes: number[]) => sizes.reduce((total, size) => total + size, 0);
  const sent = (file: string) => (existsSync(`${file}.br`) ? `${file}.br` : file);
  return [
    { name: 'entry bundle', value: kib(entry), unit: 'KiB' },
    { name: 'entry bundle, brotli', value: kib(sent(entry)), unit: 'KiB', most: 600 },
    { name: 'wasm', value: kib(wasm), unit: 'KiB' },
    { name: 'wasm, brotli', value: kib(sent(wasm)), unit: 'KiB' },
    { name: 'kept for offline, files', value: precached.length, unit: '' },
    { name: 'kept for offline', value: sum(precached.map(kib)), unit: 'KiB' },
    {
      name: 'kept for offline, over the wire',
      value: sum(precached.map((file) => kib(sent(file)))),
      unit: 'KiB',
      most: 1200,
    },
  ];
}

/** The files that the service worker names. */
function precache(folder: string): string[] {
  const worker = readFileSync(path.join(folder, 'sw.js'), 'utf8');
  const urls = [...worker.matchAll(/["']?url["']?:\s*["']([^"']+)["']/g)].map(([, url]) => url);
  const files = urls.map((url) => path.join(folder, url ?? ''));
  return [...new Set(files)].filter((file) => existsSync(file) && statSync(file).isFile());
}
