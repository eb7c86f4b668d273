import { cutHalfWidth } from './cut-half-width';

/**
 * How far down the axis the flap inside a pointed tip reaches: R − (R·tan θ + a/cos θ). Below the
 * raw narrow edge it shows in the centre hole.
 *
 * @param reachIn finished reach R, inches
 * @returns inches from the plate's centre
 */
export function tipFlap(reachIn: number, wedgeCount: number, seamIn: number): number {
  return reachIn - cutHalfWidth(reachIn, wedgeCount, seamIn);
}
