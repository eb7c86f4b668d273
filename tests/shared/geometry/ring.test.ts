import { Fraction } from 'fraction.js';

import { backgroundSquare } from '../../../shared/geometry/background-square';
import { centreCircle } from '../../../shared/geometry/centre-circle';
import { chordMargin } from '../../../shared/geometry/chord-margin';
import { cutHalfWidth } from '../../../shared/geometry/cut-half-width';
import { finishedHalfWidth } from '../../../shared/geometry/finished-half-width';
import { finishedReach } from '../../../shared/geometry/finished-reach';
import { foldedRawWidth } from '../../../shared/geometry/folded-raw-width';
import { halfAngle } from '../../../shared/geometry/half-angle';
import { holeCorner } from '../../../shared/geometry/hole-corner';
import { marginOnFolds } from '../../../shared/geometry/margin-on-folds';
import { ringArea } from '../../../shared/geometry/ring-area';
import { rowDrift } from '../../../shared/geometry/row-drift';
import { seamDrift } from '../../../shared/geometry/seam-drift';
import { shoulder } from '../../../shared/geometry/shoulder';
import { tipFlap } from '../../../shared/geometry/tip-flap';
import { InvariantError } from '../../../shared/result';
import { toText } from '../../../shared/units/fraction';

const MILLIONTH = 6;

// Figures of the design's worked example: 14-inch block, n = 20, r0 = 2, H = 4¾, a = s = ¼.
describe('a 14-inch plate of 20 wedges', () => {
  it('has 9° on each side of a wedge’s axis', () => {
    expect((halfAngle(20) * 180) / Math.PI).toBeCloseTo(9, 12);
  });

  it('cuts a wedge 1.139770 narrow and 2.644423 wide', () => {
    expect(2 * cutHalfWidth(2, 20, 0.25)).toBeCloseTo(1.13977, MILLIONTH);
    expect(2 * cutHalfWidth(6.75, 20, 0.25)).toBeCloseTo(2.644423, MILLIONTH);
  });

  it('reaches 6½, where a wedge is 2.058998 wide', () => {
    const reach = finishedReach(new Fraction(2), new Fraction('19/4'), new Fraction('1/4'));
    expect(toText(reach)).toBe('13/2');
    expect(2 * finishedHalfWidth(6.5, 20)).toBeCloseTo(2.058998, MILLIONTH);
  });

  it('has its shoulders at 5.611263, 0.888737 below the tip and 5.681208 from the centre', () => {
    const at = shoulder(6.5, 20);
    expect(at.atIn).toBeCloseTo(5.611263, MILLIONTH);
    expect(at.belowTipIn).toBeCloseTo(0.888737, MILLIONTH);
    expect(at.radiusIn).toBeCloseTo(5.681208, MILLIONTH);
    expect(at.halfWidthIn).toBeCloseTo(at.belowTipIn, 12); // folds at 45°: a right angle
  });

  it('is 2.214490 wide, raw, where it is folded', () => {
    expect(foldedRawWidth(6.5, 20, 0.25)).toBeCloseTo(2.21449, MILLIONTH);
  });

  it('has hole corners at 2.024930 and a circle of radius 2.524930', () => {
    expect(holeCorner(2, 0, 20)).toBeCloseTo(2.02493, MILLIONTH);
    expect(centreCircle(2.02493, 0.5, 0.25).finishedRadiusIn).toBeCloseTo(2.52493, MILLIONTH);
  });

  it('keeps a margin of 0.580026 with its seams on the folds', () => {
    expect(marginOnFolds(14, 6.5, 20)).toBeCloseTo(0.580026, MILLIONTH);
  });

  it('covers 102.865027 square inches', () => {
    expect(ringArea('pointed', 2, 6.5, 20)).toBeCloseTo(102.865027, MILLIONTH);
  });

  it('shrinks by 0.199764 when every seam is 1⁄32 too wide', () => {
    expect(seamDrift(1 / 32, 20)).toBeCloseTo(0.199764, MILLIONTH);
  });

  it('cuts its background 15½ and trims it to 14½', () => {
    const { cut, trim } = backgroundSquare(new Fraction(14), new Fraction('1/4'), new Fraction(1));
    expect([toText(cut), toText(trim)]).toEqual(['31/2', '29/2']);
  });
});

// Figures derived in the design, a = ¼.
describe('cut widths of other wedges', () => {
  it.each([
    [12, 1, 9, 1.053536, 5.340724],
    [20, 1.5, 6, 0.981386, 2.406846],
    [16, 2, 8, 1.305445, 3.692393],
  ])('with %i wedges from %f to %f are %f and %f', (n, narrowAt, wideAt, narrow, wide) => {
    expect(2 * cutHalfWidth(narrowAt, n, 0.25)).toBeCloseTo(narrow, MILLIONTH);
    expect(2 * cutHalfWidth(wideAt, n, 0.25)).toBeCloseTo(wide, MILLIONTH);
  });

  // a wedge 4¼ high, 2⅜ wide, 1 narrow; the exact difference is 1.346 (grilledsal, 2012-03)
  it('of 4¼ high wedges for 20 differ by 1.346', () => {
    const difference = 2 * (cutHalfWidth(5.25, 20, 0.25) - cutHalfWidth(1, 20, 0.25));
    expect(difference).toBeCloseTo(1.346, 3);
  });
});

describe('a row of pieces', () => {
  it('is ½ out over 16 seam edges of 1⁄32 each', () => {
    expect(rowDrift(1 / 32, 9)).toBe(0.5); // homeschoolquilting.com
  });

  it('is 1 7⁄16 out over 23 seams, 1⁄16 a seam', () => {
    expect(rowDrift(1 / 32, 24)).toBe(23 / 16); // catbirdquilts, 2017-02-06
  });
});

describe('every ring', () => {
  const counts = Array.from({ length: 58 }, (_, index) => index + 3);

  it('closes: its wedges’ angles sum to 360°', () => {
    for (const n of counts) expect((2 * n * halfAngle(n) * 180) / Math.PI).toBeCloseTo(360, 9);
  });

  it('of flat wedges has the area of the regular polygon ring', () => {
    for (const n of counts) {
      // n/2 · R² · sin(2π/n) with the corner radius, less the same for the hole
      const polygon = (inradius: number) =>
        ((n / 2) * Math.sin((2 * Math.PI) / n) * inradius ** 2) / Math.cos(Math.PI / n) ** 2;
      expect(ringArea('flat', 2, 7, n)).toBeCloseTo(polygon(7) - polygon(2), 9);
    }
  });

  it('has a rounded tip between a flat end at the shoulder and a square around it', () => {
    for (const n of counts) {
      const { atIn, halfWidthIn } = shoulder(7, n);
      const toShoulder = ringArea('flat', 0, atIn, n);
      expect(ringArea('pointed', 0, 7, n)).toBeCloseTo(toShoulder + n * halfWidthIn ** 2, 9);
      expect(ringArea('rounded', 0, 7, n)).toBeCloseTo(
        toShoulder + (n * Math.PI * halfWidthIn ** 2) / 2,
        9,
      );
    }
  });

  it('has neighbours’ shoulders in one point of the ray between them', () => {
    for (const n of counts) {
      const { atIn, halfWidthIn, radiusIn } = shoulder(7, n);
      expect(Math.hypot(atIn, halfWidthIn)).toBeCloseTo(radiusIn, 9);
      expect(Math.atan2(halfWidthIn, atIn)).toBeCloseTo(halfAngle(n), 9);
    }
  });

  it('is refused with fewer than three wedges, or a part of one', () => {
    for (const n of [2, 0, -3, 7.5, NaN]) expect(() => halfAngle(n)).toThrow(InvariantError);
    expect(halfAngle(3)).toBeCloseTo(Math.PI / 3, 12);
  });

  it('with few short wedges has a flap that reaches below the raw edge', () => {
    expect(tipFlap(3, 5, 0.25)).toBeCloseTo(0.511355422, 9);
    expect(tipFlap(7.25, 16, 0.25)).toBeCloseTo(5.552987547, 9);
  });

  it('of flat chords reaches farthest with its corners', () => {
    expect(chordMargin(16, 7.25, 16)).toBeCloseTo(8 - 7.25 / Math.cos(Math.PI / 16), 12);
    expect(chordMargin(16, 7.25, 16)).toBeLessThan(0.75);
  });
});
