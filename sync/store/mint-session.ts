/** A session's id: 128 random bits as 32 hex digits. */
export const mintSession = (random16: Uint8Array) =>
  [...random16].map((byte) => byte.toString(16).padStart(2, '0')).join('');
