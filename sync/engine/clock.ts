/**
 * Hybrid logical clock in whole milliseconds: the next act's time is never before, nor equal to,
 * any time this device has given or seen, and otherwise follows the wall clock.
 *
 * @param lastMs the largest time given or seen so far
 * @param nowMs the wall clock
 */
export const nextTimeMs = (lastMs: number, nowMs: number) =>
  Math.max(lastMs + 1, Math.floor(nowMs));
