import { HealthSchema, type Health } from '../../protocol/health';

/**
 * Asks whether the server is there; nothing on this device waits for it.
 *
 * @throws TypeError without a network, ZodError when the answer is not Matside's
 */
export async function fetchServerHealth(signal?: AbortSignal): Promise<Health> {
  const response = await fetch('/api/health', signal ? { signal } : {});
  return HealthSchema.parse(await response.json());
}
