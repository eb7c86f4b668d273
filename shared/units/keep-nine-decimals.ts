/**
 * Keeps an irrational length to 9 decimals, so that a plan is the same text on every engine.
 *
 * @param value any finite number (inches, or whatever it counts)
 * @returns the nearest multiple of 1e-9, never -0
 * @example keepNineDecimals(1.30544504914) // 1.305445049
 */
export function keepNineDecimals(value: number): number {
  return Math.round(value * 1e9) / 1e9 + 0;
}
