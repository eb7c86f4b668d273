import { NewerSchemaError } from '../store/migrate';
import type { StoreFailure } from './projects-client';

/**
 * A failure that people can be told of. expo-sqlite's errors carry no codes, so their texts decide;
 * a write that the browser refuses for want of room comes out as an I/O error.
 *
 * @param isFull asked about an I/O error: is the origin's room used up?
 */
export async function failureOf(
  error: unknown,
  isFull: () => Promise<boolean>,
): Promise<StoreFailure> {
  if (error instanceof NewerSchemaError) return { kind: 'newer-schema' };
  const detail = error instanceof Error ? error.message : String(error);
  if (/full|quota/i.test(detail)) return { kind: 'storage-full' };
  if (/I\/O/i.test(detail) && (await isFull())) return { kind: 'storage-full' };
  return { kind: 'failed', detail };
}
