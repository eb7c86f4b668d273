import { cutHalfWidth } from './cut-half-width';
import type { Point } from './point';

/**
 * The raw edges of a cut wedge.
 *
 * @param narrowAtIn where its narrow raw edge lies on the axis, inches from the plate's centre
 * @param wideAtIn where its wide raw edge lies
 * @returns four corners [x, y], from the narrow edge over −y
 * @example wedgeOutline(2, 7.5, 16, 0.25)[0] // [2, −0.6527…]
 */
export function wedgeOutline(
  narrowAtIn: number,
  wideAtIn: number,
  wedgeCount: number,
  seamIn: number,
): [Point, Point, Point, Point] {
  const narrow = cutHalfWidth(narrowAtIn, wedgeCount, seamIn);
  const wide = cutHalfWidth(wideAtIn, wedgeCount, seamIn);
  return [
    [narrowAtIn, -narrow],
    [wideAtIn, -wide],
    [wideAtIn, wide],
    [narrowAtIn, narrow],
  ];
}
