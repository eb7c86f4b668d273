import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder. Everything that the scripts write lies in it, under .data and .cache. */
export const ROOT = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
/** Kept: databases and secrets. */
export const DATA = path.join(ROOT, '.data');
/** Can be thrown away at any time that nothing runs: builds, unpacked packages, Metro's cache. */
export const CACHE = path.join(ROOT, '.cache');
