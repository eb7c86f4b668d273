import { v7 } from 'uuid';

/** A UUIDv7: sorts by the time it was made. `random16` where the platform has no web crypto. */
export const newId = (nowMs: number, random16?: Uint8Array) =>
  v7(random16 ? { msecs: nowMs, random: random16 } : { msecs: nowMs });
