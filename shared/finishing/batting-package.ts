import { type Fraction } from 'fraction.js';

import type { Size } from './size';

/** Sizes that batting is sold in, inches, smallest first. From memory; packages differ. */
const PACKAGES = [
  [45, 60],
  [72, 90],
  [81, 96],
  [90, 108],
  [120, 120],
] as const;

/**
 * The smallest usual package that a batting is cut from, turned if need be.
 *
 * @param batting its size, overhang included, inches
 * @returns the package's shorter and longer side; null when none is large enough
 */
export function battingPackage({ width, height }: Size): readonly [number, number] | null {
  const [shorter, longer] = width.lte(height) ? [width, height] : [height, width];
  const covers = (side: number, needed: Fraction) => needed.lte(side);
  return PACKAGES.find(([a, b]) => covers(a, shorter) && covers(b, longer)) ?? null;
}
