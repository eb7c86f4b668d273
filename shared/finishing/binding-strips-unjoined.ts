import { type Fraction } from 'fraction.js';

/**
 * The short rule ⌈L/U⌉, which forgets what the joins lose; shown beside the true count where the
 * two differ.
 *
 * @param length L of the binding, inches
 * @param usableWidth U, inches
 * Source: the rule that most charts print.
 * @example bindingStripsUnjoined(new Fraction(290), new Fraction(42)) // 7, where 8 are needed
 */
export function bindingStripsUnjoined(length: Fraction, usableWidth: Fraction): number {
  return Number(length.div(usableWidth).ceil().n);
}
