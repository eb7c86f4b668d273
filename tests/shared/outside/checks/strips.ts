import { Fraction } from 'fraction.js';

import { piecesPerStrip } from '../../../../shared/cutting/pieces-per-strip';
import { squaresFromPiece } from '../../../../shared/cutting/squares-from-piece';
import { stripsForCount } from '../../../../shared/cutting/strips-for-count';
import { inchesAfterWash, yardsToBuy } from '../../../../shared/cutting/yards-to-buy';
import { joinedStrips } from '../../../../shared/finishing/joined-strips';
import { joinedWidth } from '../../../../shared/finishing/joined-width';
import { defaultRequest } from '../../../../shared/plan/default-request';
import { toText } from '../../../../shared/units/fraction';
import { upToEighthYard } from '../../../../shared/units/up-to-eighth-yard';
import { choices, planOf } from '../../support/plans';
import type { Checks } from '../rows';

const inches = (value: string | number) => new Fraction(value);
const QUARTER = inches('1/4');

type SquareRow = [side: string, squares: number];

function expectSquares(width: number, length: number, rows: SquareRow[]) {
  const ours = rows.map(([side]): SquareRow => [
    side,
    squaresFromPiece(inches(width), inches(length), inches(side)),
  ]);
  expect(ours).toEqual(rows);
}

const clothChecks: Checks = {
  'strips.usable-width': () => {
    const request = defaultRequest(choices({ blocks: 3 }));
    expect(request.cloth.usableWidth).toBe('42');
    // three backgrounds of 13½ come from 42, not from 40
    expect(planOf(request).warnings).toContainEqual({
      code: 'anotherStripAt40',
      params: { fabric: 'F', strips: 1, atForty: 2 },
    });
  },

  'strips.shrink': () => {
    expect(toText(inchesAfterWash(inches(100).div(36), inches(3)))).toBe('97');
    expect(toText(yardsToBuy(inches(97), inches(3)))).toBe('23/8'); // 100 in, to the eighth
    // 131 × 1.03 are 134.93 in, so 30 eighths; 131 ÷ 0.97 are 135.05, so 31
    expect(toText(yardsToBuy(inches(131), inches(3)))).toBe('31/8');
  },

  'strips.yards': () => {
    expect(toText(upToEighthYard(inches(36)))).toBe('1');
    expect(toText(upToEighthYard(inches('9/2')))).toBe('1/8');
    expect(toText(upToEighthYard(inches('37/8')))).toBe('1/4');
  },

  'strips.of-44': () => {
    expect(piecesPerStrip(inches(44), inches('7/2'))).toBe(12);
    expect(stripsForCount(100, 12)).toBe(9);
  },

  'strips.of-42': () => {
    expect(piecesPerStrip(inches(42), inches('9/2'))).toBe(9);
    expect(stripsForCount(140, 9)).toBe(16);
  },

  'strips.squares': () => {
    const rows = [
      ['5/2', 16, 16],
      ['3', 13, 14],
      ['7/2', 11, 12],
      ['9/2', 8, 9],
      ['5', 8, 8],
      ['13/2', 6, 6],
    ] as const;
    for (const [side, at40, at42] of rows) {
      expect(piecesPerStrip(inches(40), inches(side))).toBe(at40);
      expect(piecesPerStrip(inches(42), inches(side))).toBe(at42);
    }
  },

  // the sizes are from memory, the squares counted by hand
  'strips.pre-cuts': () => {
    expectSquares(22, 18, [['5', 12]]);
    expectSquares(22, 9, [
      ['5', 4],
      ['9/2', 8],
    ]);
    expectSquares(42, 2.5, [['5/2', 16]]);
    expectSquares(10, 10, [
      ['5', 4],
      ['5/2', 16],
    ]);
    expectSquares(5, 5, [['5/2', 4]]);
  },
};

const pieceChecks: Checks = {
  'strips.joined': () => {
    const joined = (strips: number, length: number, width: string) =>
      toText(joinedStrips(strips, inches(length), inches(width)));
    expect(joined(2, 10, '3')).toBe('17');
    expect(joined(2, 7, '5')).toBe('9');
    expect(joined(2, 20, '3/2')).toBe('77/2');
  },

  'strips.sets': () => {
    expect(toText(joinedWidth(9, inches('13/4'), QUARTER))).toBe('101/4');
    expect(toText(joinedWidth(16, inches('19/8'), QUARTER))).toBe('61/2');
  },

  'strips.set-of-three': () => expect(toText(joinedWidth(3, inches('3/2'), QUARTER))).toBe('7/2'),

  'strips.fat-quarter': () => {
    expectSquares(22, 18, [
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
    ]);
    expect(toText(inches('11/2').mul(piecesPerStrip(inches(22), inches('11/2'))))).toBe('22');
  },

  'strips.from-a-yard': () =>
    expectSquares(44, 36, [
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
    ]),

  // the chart's heading says 42: no width between gives 35 either
  'strips.from-a-yard-slip': () => {
    for (const width of [42, 43, 44]) expectSquares(width, 36, [['7', 30]]);
  },

  'strips.63-squares': () => {
    const side = inches('19/2');
    expect(piecesPerStrip(inches(42), side)).toBe(4);
    const strips = stripsForCount(63, 4);
    expect(strips).toBe(16);
    expect(toText(side.mul(strips))).toBe('152');
    const yards = yardsToBuy(side.mul(strips), inches(0));
    expect(toText(yards)).toBe('17/4');
    expect(yards.valueOf() - 4.22).toBeGreaterThan(0);
  },
};

/** Rows of strips, squares and yards. */
export const stripChecks: Checks = { ...clothChecks, ...pieceChecks };
