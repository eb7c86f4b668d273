import { type Fraction } from 'fraction.js';

/**
 * The background of a plate: cut with room to spare, trimmed from the centre afterwards.
 *
 * @param block finished side B, inches
 * @param seam allowance a on each side
 * @param trimAllowance what is cut more in all, half of it on each side
 * @returns inches: cut B + 2a + trim allowance, trim B + 2a
 */
export function backgroundSquare(
  block: Fraction,
  seam: Fraction,
  trimAllowance: Fraction,
): { cut: Fraction; trim: Fraction } {
  const trim = block.add(seam.mul(2));
  return { cut: trim.add(trimAllowance), trim };
}
