import { Fraction } from 'fraction.js';

import { piecesPerStrip } from '../../../shared/cutting/pieces-per-strip';
import { planFabric } from '../../../shared/cutting/plan-fabric';
import { squareStrips } from '../../../shared/cutting/square-strips';
import { squaresFromPiece } from '../../../shared/cutting/squares-from-piece';
import { stripRun } from '../../../shared/cutting/strip-run';
import { stripsForCount } from '../../../shared/cutting/strips-for-count';
import { wedgePitch } from '../../../shared/cutting/wedge-pitch';
import { wedgesPerStrip } from '../../../shared/cutting/wedges-per-strip';
import { inchesAfterWash, yardsToBuy } from '../../../shared/cutting/yards-to-buy';
import { cutHalfWidth } from '../../../shared/geometry/cut-half-width';
import { InvariantError } from '../../../shared/result';
import { toText } from '../../../shared/units/fraction';
import { fabricsAToZ } from '../support/plans';

const inches = (text: string) => new Fraction(text);

describe('straight pieces', () => {
  it('of 3½ come 12 to a 44-inch strip, so 100 take 9 strips', () => {
    // harriger.com, inch2yard
    expect(piecesPerStrip(inches('44'), inches('7/2'))).toBe(12);
    expect(stripsForCount(100, 12)).toBe(9);
  });

  it('of 4½ come 9 to a 42-inch strip, so 140 take 16 strips', () => {
    // modernquiltingbyb.com
    expect(piecesPerStrip(inches('42'), inches('9/2'))).toBe(9);
    expect(stripsForCount(140, 9)).toBe(16);
  });

  // derived in the design: squares per strip of 40 and of 42
  it.each([
    ['5/2', 16, 16],
    ['3', 13, 14],
    ['7/2', 11, 12],
    ['9/2', 8, 9],
    ['5', 8, 8],
    ['13/2', 6, 6],
  ])('of %s come %i to 40 inches and %i to 42', (side, at40, at42) => {
    expect(piecesPerStrip(inches('40'), inches(side))).toBe(at40);
    expect(piecesPerStrip(inches('42'), inches(side))).toBe(at42);
  });

  // docsbay.net, "Number of squares from a fat quarter": 18 × 22
  it.each([
    ['2', 99],
    ['5/2', 56],
    ['3', 42],
    ['7/2', 30],
    ['4', 20],
    ['9/2', 16],
    ['5', 12],
    ['11/2', 12],
    ['6', 9],
    ['13/2', 6],
  ])('of %s come %i from a fat quarter', (side, squares) => {
    expect(squaresFromPiece(inches('22'), inches('18'), inches(side))).toBe(squares);
  });

  // quilterscache.com, math charts: a yard of 44-inch cloth
  it.each([
    ['3/2', 696],
    ['5/2', 238],
    ['3', 168],
    ['7/2', 120],
    ['31/8', 99],
    ['9/2', 72],
    ['5', 56],
    ['13/2', 30],
    ['17/2', 20],
    ['25/2', 6],
  ])('of %s come %i from a yard', (side, squares) => {
    expect(squaresFromPiece(inches('44'), inches('36'), inches(side))).toBe(squares);
  });

  it('that are wider than the cloth come from no strip', () => {
    expect(piecesPerStrip(inches('42'), inches('43'))).toBe(0);
    expect(() => stripsForCount(1, 0)).toThrow(InvariantError);
  });

  it('as backgrounds of 13½ come three to a strip of 42', () => {
    expect(squareStrips('background', inches('27/2'), 5, inches('42'))).toEqual({
      height: '27/2',
      count: 2,
      for: 'background',
      lengths: 5,
      length: '27/2',
      each: 1,
    });
  });
});

describe('wedges along a strip', () => {
  const narrowIn = 2 * cutHalfWidth(2, 20, 0.25);
  const wideIn = 2 * cutHalfWidth(6.75, 20, 0.25);

  // the design's worked example
  it('of the 14-inch plate tumble 1.892096 apart: 21 to a strip of 42, 20 to one of 40', () => {
    const pitchIn = wedgePitch(narrowIn, wideIn, false);
    expect(pitchIn).toBeCloseTo(1.892096, 6);
    expect(wedgesPerStrip(42, wideIn, pitchIn)).toBe(21);
    expect(42 - stripRun(21, wideIn, pitchIn)).toBeCloseTo(1.513649, 6);
    expect(wedgesPerStrip(40, wideIn, pitchIn)).toBe(20);
    expect(40 - stripRun(20, wideIn, pitchIn)).toBeCloseTo(1.405746, 6);
  });

  it('of a one-way print take a wide edge each', () => {
    expect(wedgePitch(narrowIn, wideIn, true)).toBe(wideIn);
    expect(wedgesPerStrip(42, wideIn, wideIn)).toBe(15);
    expect(stripRun(4, wideIn, wideIn)).toBeCloseTo(4 * wideIn, 12);
  });

  it('of which just one fits, and just none', () => {
    expect(wedgesPerStrip(wideIn, wideIn, 1)).toBe(1);
    expect(wedgesPerStrip(wideIn - 0.001, wideIn, 1)).toBe(0);
  });

  it('fit, and one more would not', () => {
    for (let usableIn = 3; usableIn < 50; usableIn += 0.37) {
      const k = wedgesPerStrip(usableIn, wideIn, 1.892096);
      expect(stripRun(k, wideIn, 1.892096)).toBeLessThanOrEqual(usableIn);
      expect(stripRun(k + 1, wideIn, 1.892096)).toBeGreaterThan(usableIn);
    }
  });
});

describe('yards', () => {
  it('are bought so that 97 in are there after 3 % are lost: 100 in, not 97 × 1.03', () => {
    // siliconvalleyqfk.org: 3 % along the length
    expect(toText(yardsToBuy(inches('97'), inches('3')))).toBe('23/8'); // 100 ÷ 4½, up
    expect(toText(inchesAfterWash(inches('100').div(36), inches('3')))).toBe('97');
    expect(toText(yardsToBuy(inches('10476/100'), inches('3')))).toBe('3'); // 108 in, to the inch
    expect(toText(yardsToBuy(inches('10477/100'), inches('3')))).toBe('25/8');
  });

  it('are what the maker set, where she bought more', () => {
    const [fabric] = fabricsAToZ(1);
    if (!fabric) throw new Error('no fabric');
    const strips = [squareStrips('circle', inches('5'), 1, inches('42'))];
    expect(planFabric(fabric, strips, inches('0'))).toMatchObject({
      needs: '5',
      buyYards: '1/4',
      spare: '4',
    });
    expect(planFabric({ ...fabric, buyYards: '1/2' }, strips, inches('0'))).toMatchObject({
      buyYards: '1/2',
      spare: '13',
    });
    expect(planFabric(fabric, strips, inches('10'))).toMatchObject({
      buyYards: '1/4',
      spare: '31/10',
    });
  });
});
