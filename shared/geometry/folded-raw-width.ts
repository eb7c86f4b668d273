import { cutHalfWidth } from './cut-half-width';
import { halfAngle } from './half-angle';

/**
 * Raw width of a wedge with a pointed tip at its folded end, where its side seams begin.
 *
 * @param reachIn finished reach R, inches
 * @returns inches: 2(R·tan θ + a/cos θ)/(1 + tan θ)
 * @example foldedRawWidth(6.5, 20, 0.25) // 2.2144…
 */
export function foldedRawWidth(reachIn: number, wedgeCount: number, seamIn: number): number {
  return (2 * cutHalfWidth(reachIn, wedgeCount, seamIn)) / (1 + Math.tan(halfAngle(wedgeCount)));
}
