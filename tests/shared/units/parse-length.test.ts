import * as fc from 'fast-check';

import { formatFraction } from '../../../shared/units/format-fraction';
import { parseLength } from '../../../shared/units/parse-length';

describe('parseLength', () => {
  it.each([
    ['4 1/4', '17/4'],
    ['4¼', '17/4'],
    ['4 ¼', '17/4'],
    ['4.25', '17/4'],
    ['4,25', '17/4'],
    ['17/4', '17/4'],
    ['4¼"', '17/4'],
    ['4¼″', '17/4'],
    ['4¼ in', '17/4'],
    ['4 1/4 inches', '17/4'],
    ['4-1/4', '17/4'],
    ['  4  1/4  ', '17/4'],
    ['1 3⁄16', '19/16'],
    ['⅜', '3/8'],
    ['.5', '1/2'],
    ['12', '12'],
    ['2/4', '1/2'],
  ])('reads %s as %s', (text, value) => {
    expect(parseLength(text)).toEqual({ ok: true, value });
  });

  it.each([
    '',
    ' ',
    'four',
    '4 1',
    '4 1/',
    '1/0',
    '4..5',
    '1e3',
    '4¼¼',
    '0x10',
    'NaN',
    '4 1/4 cm',
    '¼/2',
  ])('does not take %p for a length', (text) => {
    expect(parseLength(text)).toEqual({ ok: false, kind: 'not-a-length' });
  });

  it.each(['0', '0/4', '-4', '−4 1/4', '-¼', '0.0'])('finds %s not positive', (text) => {
    expect(parseLength(text)).toEqual({ ok: false, kind: 'not-positive' });
  });

  it('reads back what formatFraction writes', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 4000 }),
        fc.constantFrom(1, 2, 3, 4, 8, 16, 32),
        (n, d) => {
          const parsed = parseLength(`${n}/${d}`);
          if (!parsed.ok) return false;
          expect(parseLength(formatFraction(parsed.value))).toEqual(parsed);
          return true;
        },
      ),
    );
  });

  it('answers any text at all', () => {
    fc.assert(fc.property(fc.string(), (text) => typeof parseLength(text).ok === 'boolean'));
  });
});
