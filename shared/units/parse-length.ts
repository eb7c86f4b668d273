import { Fraction } from 'fraction.js';

import type { FractionText } from '../model/length';
import type { Result } from '../result';
import { toText } from './fraction';

export type LengthFailure = { kind: 'not-a-length' | 'not-positive' };

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};
const VULGAR_CHARACTER = new RegExp(`[${Object.keys(VULGAR).join('')}]`, 'g');
const UNIT = /\s*(″|"|''|inches|inch|in\.?)$/i;
const DECIMAL = /^(\d{1,6}(?:[.,]\d{1,6})?|[.,]\d{1,6})$/;
const PARTS = /^(?:(\d{1,6})\s+)?(\d{1,6})\s*\/\s*(\d{1,5})$/;

/**
 * Reads a length in inches as a maker types it: 4 1/4, 4¼, 4-1/4, 4.25, 17/4, with or without in.
 *
 * @returns the exact fraction in lowest terms; `not-a-length` for anything else, `not-positive`
 *   for 0 and for negative lengths
 * @example parseLength('4 ¼ in') // { ok: true, value: '17/4' }
 */
export function parseLength(text: string): Result<FractionText, LengthFailure> {
  const plain = text
    .trim()
    .replace(UNIT, '')
    .replace(VULGAR_CHARACTER, (character) => ` ${VULGAR[character] ?? ''}`)
    .replace(/⁄/g, '/')
    .replace(/[−–]/g, '-')
    .replace(/(\d)-(?=\d)/, '$1 ')
    .trim();
  const negative = plain.startsWith('-');
  const value = readUnsigned(negative ? plain.slice(1).trim() : plain);
  if (!value) return { ok: false, kind: 'not-a-length' };
  if (negative || value.equals(0)) return { ok: false, kind: 'not-positive' };
  return { ok: true, value: toText(value) };
}

function readUnsigned(plain: string): Fraction | null {
  if (DECIMAL.test(plain)) return new Fraction(plain.replace(',', '.').replace(/^\./, '0.'));
  const parts = PARTS.exec(plain);
  if (!parts) return null;
  const [, whole = '0', numerator = '0', denominator = '0'] = parts;
  if (Number(denominator) === 0) return null;
  return new Fraction(`${numerator}/${denominator}`).add(whole);
}
