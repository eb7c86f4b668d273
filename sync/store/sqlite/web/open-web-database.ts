import { createKeepSoon } from '../../keep-soon';
import type { SqlDatabase } from '../../sql-database';
import { openBytes, openDatabase, type CopyableDatabase } from '../open-database';
import { readCopy, writeCopy } from './memory-copies';

const FILE = 'matside.db';

export interface WebDatabase {
  db: SqlDatabase;
  storage: 'private' | 'memory';
  /** Called after every write. */
  keep(): void;
}

let announced: Promise<'opfs' | 'memory'> | null = null;

/** The worker tells once, when it makes its file system (access-handle-pool.js). */
function storageMode(): Promise<'opfs' | 'memory'> {
  announced ??= new Promise((resolve) => {
    const channel = new BroadcastChannel('expo-sqlite-vfs');
    channel.onmessage = ({ data }: MessageEvent<{ mode: 'opfs' | 'memory' }>) => {
      channel.close();
      resolve(data.mode);
    };
  });
  return announced;
}

/** The origin's private file, or a database in memory that is copied to IndexedDB as it changes. */
export async function openWebDatabase(): Promise<WebDatabase> {
  const mode = storageMode();
  const db = await openDatabase(FILE);
  if ((await mode) === 'opfs') return { db, storage: 'private', keep() {} };
  await db.close();
  const bytes = await readCopy().catch(() => null);
  return keepCopies(bytes ? await openBytes(bytes) : await openDatabase(':memory:'));
}

function keepCopies(db: CopyableDatabase): WebDatabase {
  const copies = createKeepSoon(
    async () => writeCopy(await db.toBytes()),
    (delayMs, job) => {
      const timer = setTimeout(job, delayMs);
      return () => clearTimeout(timer);
    },
  );
  const flush = () => void copies.flush();
  const flushHidden = () => document.visibilityState === 'hidden' && flush();
  addEventListener('pagehide', flush);
  document.addEventListener('visibilitychange', flushHidden);
  const close = async () => {
    removeEventListener('pagehide', flush);
    document.removeEventListener('visibilitychange', flushHidden);
    await copies.flush();
    await db.close();
  };
  return { db: { ...db, close }, storage: 'memory', keep: copies.touch };
}
