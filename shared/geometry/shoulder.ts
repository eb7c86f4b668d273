import { halfAngle } from './half-angle';

/** Where a pointed or rounded tip leaves the finished side seam. All in inches. */
export interface Shoulder {
  /** on the axis, from the plate's centre: R/(1 + tan θ) */
  atIn: number;
  /** half the finished width there; the radius of a rounded tip */
  halfWidthIn: number;
  /** from the plate's centre along the side seam: R/(cos θ + sin θ) */
  radiusIn: number;
  /** below the tip: t = (W_s/2)/(1 + tan θ) */
  belowTipIn: number;
}

/**
 * The shoulder of a tip. A pointed tip is a right angle at the reach for every ring, its folds at
 * 45° to the axis, so a fold meets the finished side where R − x = x·tan θ. Neighbours' shoulders
 * are the same point of the ray between them.
 *
 * @param reachIn finished reach R, inches
 * @param wedgeCount wedges in the full ring, ≥ 3
 * @example shoulder(6.5, 20).atIn // 5.6112…
 */
export function shoulder(reachIn: number, wedgeCount: number): Shoulder {
  const theta = halfAngle(wedgeCount);
  const tan = Math.tan(theta);
  const atIn = reachIn / (1 + tan);
  return {
    atIn,
    halfWidthIn: atIn * tan,
    radiusIn: reachIn / (Math.cos(theta) + Math.sin(theta)),
    belowTipIn: (reachIn * tan) / (1 + tan),
  };
}
