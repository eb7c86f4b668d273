import * as fc from 'fast-check';
import { Fraction } from 'fraction.js';

import { toFraction, toText } from '../../../shared/units/fraction';
import { downToEighth } from '../../../shared/units/down-to-eighth';
import { keepNineDecimals } from '../../../shared/units/keep-nine-decimals';
import { nearestSixteenth } from '../../../shared/units/nearest-sixteenth';
import { upToEighth, upToHalf } from '../../../shared/units/up-to-eighth';
import { upToEighthYard } from '../../../shared/units/up-to-eighth-yard';

describe('rounding by a named policy', () => {
  it('cuts up to the next eighth, and leaves an eighth alone', () => {
    expect(toText(upToEighth(5.578364633))).toBe('45/8');
    expect(toText(upToEighth(4.625))).toBe('37/8');
    expect(toText(upToEighth(new Fraction('37/8')))).toBe('37/8');
    expect(toText(upToEighth(new Fraction(4.6251)))).toBe('19/4');
  });

  it('cuts never below the exact value, and less than an eighth above it', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1e6 }), fc.integer({ min: 1, max: 1e4 }), (n, d) => {
        const exact = new Fraction(n, d);
        const over = upToEighth(exact).sub(exact);
        return over.gte(0) && over.lt('1/8');
      }),
    );
  });

  it('finds the most eighths that still fit', () => {
    expect(toText(downToEighth(new Fraction(4.722)))).toBe('37/8');
    expect(toText(downToEighth(new Fraction('37/8')))).toBe('37/8');
  });

  it('takes a square up to the next half inch', () => {
    expect(toText(upToHalf(new Fraction('47/8')))).toBe('6');
    expect(toText(upToHalf(new Fraction('39/8')))).toBe('5');
  });

  it('buys cloth by the eighth of a yard: 152 in are 4¼ yd', () => {
    // 63 squares from 16 widths, quiltingboard.com post 6228687
    expect(toText(upToEighthYard(new Fraction(152)))).toBe('17/4');
    expect(toText(upToEighthYard(new Fraction('27/2')))).toBe('3/8');
    expect(toText(upToEighthYard(new Fraction('271/20')))).toBe('1/2');
  });

  it('shows a measured size to the nearest sixteenth', () => {
    expect(toText(nearestSixteenth(1.305445049))).toBe('21/16');
    expect(toText(nearestSixteenth(1.28))).toBe('5/4');
  });

  it('keeps nine decimals', () => {
    expect(keepNineDecimals(1.30544504914)).toBe(1.305445049);
    expect(Object.is(keepNineDecimals(-1e-12), 0)).toBe(true);
  });

  it('writes fractions in lowest terms', () => {
    expect(toText(toFraction('6/4'))).toBe('3/2');
    expect(toText(toFraction('8/4'))).toBe('2');
  });
});
