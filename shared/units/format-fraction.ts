import { type Fraction } from 'fraction.js';

import type { FractionText } from '../model/length';
import { toFraction } from './fraction';

const VULGAR: Record<string, string> = {
  '1/2': '½',
  '1/3': '⅓',
  '2/3': '⅔',
  '1/4': '¼',
  '3/4': '¾',
  '1/8': '⅛',
  '3/8': '⅜',
  '5/8': '⅝',
  '7/8': '⅞',
};

/**
 * Writes an exact fraction as a maker reads it.
 *
 * @param value exact fraction text
 * @returns "4¼", "1⅝", "13⁄16", "1 3⁄16" (with a fraction slash)
 * @example formatFraction('17/4') // '4¼'
 */
export function formatFraction(value: FractionText): string {
  const fraction = toFraction(value);
  const sign = fraction.s < 0n ? '−' : '';
  const whole = fraction.abs().floor();
  const rest = fraction.abs().sub(whole);
  if (rest.equals(0)) return `${sign}${whole.toFraction()}`;
  return `${sign}${joinParts(whole, rest)}`;
}

function joinParts(whole: Fraction, rest: Fraction): string {
  const text = rest.toFraction();
  const vulgar = VULGAR[text];
  const part = vulgar ?? text.replace('/', '⁄');
  if (whole.equals(0)) return part;
  return vulgar ? `${whole.toFraction()}${part}` : `${whole.toFraction()} ${part}`;
}

/** An exact fraction with its unit. @example formatInches('17/4') // '4¼ in' */
export function formatInches(value: FractionText): string {
  return `${formatFraction(value)} in`;
}

/** An exact fraction of yards with its unit. @example formatYards('3/8') // '⅜ yd' */
export function formatYards(value: FractionText): string {
  return `${formatFraction(value)} yd`;
}

/** A template length in decimals. @example formatExact(0.981386, 2) // '0.98' */
export function formatExact(value: number, places = 2): string {
  return value.toFixed(places).replace('-', '−');
}
