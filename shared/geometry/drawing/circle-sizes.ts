import type { FractionText } from '../../model/length';
import type { Plan } from '../../model/plan';

import { toInches } from './to-inches';

export interface CircleSizes {
  letter: string;
  /** the cut diameter and the square it is drawn on */
  cut: FractionText;
  cutIn: number;
  square: FractionText;
  squareIn: number;
  /** radius once the edge is turned; what is turned is 0 for a fused edge */
  finishedIn: number;
  turningIn: number;
}

/** Sizes of the centre circle; null for an open hole. */
export function circleSizes(plan: Plan): CircleSizes | null {
  const { circle } = plan.geometry;
  const { centre } = plan.request;
  if (circle === null || centre.shape !== 'circle') return null;
  const { cut } = circle.cutDiameter;
  return {
    letter: centre.fabric,
    cut,
    cutIn: toInches(cut),
    square: circle.square,
    squareIn: toInches(circle.square),
    finishedIn: toInches(circle.finishedRadius),
    turningIn: centre.edge === 'turned' ? toInches(centre.turning) : 0,
  };
}
