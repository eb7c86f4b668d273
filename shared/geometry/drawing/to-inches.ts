import type { FractionText, Length } from '../../model/length';
import { toFraction, toText } from '../../units/fraction';

/** A length of a plan as a plain number of inches, for drawing only. */
export function toInches(length: Length): number {
  return typeof length === 'string' ? toFraction(length).valueOf() : length.exact;
}

/** Half of an exact length, for what is measured from the middle. @example halfOf('33/2') // '33/4' */
export const halfOf = (length: FractionText): FractionText => toText(toFraction(length).div(2));
