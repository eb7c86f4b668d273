import { Fraction } from 'fraction.js';

import type { FractionText } from '../model/length';

/** The exact rational behind a text; the text must be of the form of `FractionTextSchema`. */
export function toFraction(text: FractionText): Fraction {
  return new Fraction(text);
}

/** The one text of a rational: lowest terms, no denominator of 1. @example "11/2" */
export function toText(value: Fraction): FractionText {
  return value.toFraction();
}
