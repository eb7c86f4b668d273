const DATABASE = 'matside-memory';
const STORE = 'copies';
const KEY = 'matside.db';

/** The bytes of the database as they were last kept in IndexedDB, null when there are none. */
export async function readCopy(): Promise<Uint8Array | null> {
  const db = await openCopies();
  const bytes: unknown = await toPromise(db.transaction(STORE).objectStore(STORE).get(KEY));
  db.close();
  return bytes instanceof Uint8Array ? bytes : null;
}

export async function writeCopy(bytes: Uint8Array): Promise<void> {
  const db = await openCopies();
  const transaction = db.transaction(STORE, 'readwrite');
  transaction.objectStore(STORE).put(bytes, KEY);
  await new Promise<void>((resolve, reject) => {
    transaction.oncomplete = () => resolve();
    transaction.onabort = () => reject(transaction.error);
  });
  db.close();
}

function openCopies(): Promise<IDBDatabase> {
  const request = indexedDB.open(DATABASE, 1);
  request.onupgradeneeded = () => request.result.createObjectStore(STORE);
  return toPromise(request);
}

const toPromise = <T>(request: IDBRequest<T>) =>
  new Promise<T>((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });
