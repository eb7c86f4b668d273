import * as fc from 'fast-check';
import { Fraction } from 'fraction.js';

import { biasSquareSide } from '../../../shared/finishing/bias-square-side';
import { bindingCloth } from '../../../shared/finishing/binding-cloth';
import { bindingLength } from '../../../shared/finishing/binding-length';
import { bindingStrips } from '../../../shared/finishing/binding-strips';
import { bindingStripsUnjoined } from '../../../shared/finishing/binding-strips-unjoined';
import { joinedStrips } from '../../../shared/finishing/joined-strips';
import { toText } from '../../../shared/units/fraction';

const inches = (value: string | number) => new Fraction(value);
const eighths = (least: number, most: number) =>
  fc.integer({ min: least, max: most }).map((count) => new Fraction(count, 8));

describe('a binding', () => {
  it('goes round the quilt with 10 inches over', () => {
    expect(toText(bindingLength({ width: inches('121/2'), height: inches(80) }))).toBe('291');
  });

  it('of a single strip loses nothing to joins', () => {
    expect(toText(joinedStrips(1, inches(42), inches('5/2')))).toBe('42');
    expect(bindingStrips(inches(42), inches(42), inches('5/2'))).toBe(1);
    expect(bindingStrips(inches('337/8'), inches(42), inches('5/2'))).toBe(2);
  });

  it('takes the least number of strips that is long enough when joined', () => {
    fc.assert(
      fc.property(eighths(80, 4000), eighths(280, 400), eighths(8, 32), (length, usable, width) => {
        const strips = bindingStrips(length, usable, width);
        expect(joinedStrips(strips, usable, width).gte(length)).toBe(true);
        if (strips > 1) {
          expect(joinedStrips(strips - 1, usable, width).lt(length)).toBe(true);
        }
        expect(bindingStripsUnjoined(length, usable)).toBeLessThanOrEqual(strips);
      }),
    );
  });

  it('of 42-inch strips round 60 × 80 leaves 28½ in of binding and 2½ in of cloth', () => {
    const quilt = { width: inches(60), height: inches(80) };
    const cloth = bindingCloth(quilt, inches('5/2'), inches(42));
    // 8 × 42 − 7 × 2½ − 290; ⅝ yd are 22½ in, 8 × 2½ of them used
    expect(toText(cloth.bindingLeft)).toBe('57/2');
    expect(toText(cloth.spare)).toBe('5/2');
  });
});

describe('the square for a bias binding', () => {
  it('has at least the area of the binding, and an inch less would not do', () => {
    fc.assert(
      fc.property(eighths(80, 4000), eighths(8, 32), (length, width) => {
        const side = biasSquareSide(length, width);
        const area = length.mul(width);
        expect(area.lte(side * side)).toBe(true);
        expect(area.gt((side - 1) * (side - 1))).toBe(true);
      }),
    );
  });
});
