import { Fraction } from 'fraction.js';

import { keepNineDecimals } from './keep-nine-decimals';

/**
 * Rounds a cut size up to the next eighth of an inch, never below the exact value. For squares,
 * strips and units that are trimmed; wedges and other template pieces are cut at exact size.
 *
 * @param exactIn inches: a fraction, or a number that counts to its ninth decimal
 * @example upToEighth(5.578364633) // 45/8
 */
export function upToEighth(exactIn: Fraction | number): Fraction {
  return upToPart(exactIn, 8);
}

/** Rounds up to the next half inch. @param exactIn inches */
export function upToHalf(exactIn: Fraction | number): Fraction {
  return upToPart(exactIn, 2);
}

function upToPart(exactIn: Fraction | number, partsPerInch: number): Fraction {
  const exact =
    typeof exactIn === 'number' ? new Fraction(keepNineDecimals(exactIn).toFixed(9)) : exactIn;
  return exact.mul(partsPerInch).ceil().div(partsPerInch);
}
