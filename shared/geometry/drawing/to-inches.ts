import type { Length } from '../../model/length';
import { toFraction } from '../../units/fraction';

/** A length of a plan as a plain number of inches, for drawing only. */
export function toInches(length: Length): number {
  return typeof length === 'string' ? toFraction(length).valueOf() : length.exact;
}
