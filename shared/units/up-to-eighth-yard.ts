import { type Fraction } from 'fraction.js';

const INCHES_PER_EIGHTH_YARD = '9/2';

/**
 * Cloth is bought by the eighth of a yard, and never less than is needed.
 *
 * @param inches length along the cloth
 * @returns yards: ⌈inches ÷ 4½⌉ ÷ 8
 * @example upToEighthYard(new Fraction(152)) // 17/4
 */
export function upToEighthYard(inches: Fraction): Fraction {
  return inches.div(INCHES_PER_EIGHTH_YARD).ceil().div(8);
}
