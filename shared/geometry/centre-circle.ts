import { type Fraction } from 'fraction.js';

import { upToEighth, upToHalf } from '../units/up-to-eighth';

const ROOM_AROUND_CIRCLE = '1/4';

export interface CentreCircle {
  /** finished radius: the hole's corner and the overlap, inches */
  finishedRadiusIn: number;
  /** exact diameter of the cut circle, its own turning included, inches */
  cutDiameterIn: number;
  /** the same, up to the next eighth */
  cut: Fraction;
  /** side of the square it is cut from: ¼ more, up to the next half inch */
  square: Fraction;
}

/**
 * The circle that covers the hole's corners.
 *
 * @param holeCornerIn radius of the hole's corners, inches
 * @param overlapIn cover beyond those corners, inches
 * @param turningIn its own turning, 0 for a fused raw edge
 * @example centreCircle(2.039182316, 0.5, 0.25).cut // 45/8
 */
export function centreCircle(
  holeCornerIn: number,
  overlapIn: number,
  turningIn: number,
): CentreCircle {
  const finishedRadiusIn = holeCornerIn + overlapIn;
  const cutDiameterIn = 2 * (finishedRadiusIn + turningIn);
  const cut = upToEighth(cutDiameterIn);
  return { finishedRadiusIn, cutDiameterIn, cut, square: upToHalf(cut.add(ROOM_AROUND_CIRCLE)) };
}
