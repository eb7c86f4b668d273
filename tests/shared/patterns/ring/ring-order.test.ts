import * as fc from 'fast-check';

import { fabricOrder } from '../../../../shared/patterns/ring/fabric-order';
import { ringLetters } from '../../../../shared/patterns/ring/ring-letters';
import { ringUnits, type RingUnit } from '../../../../shared/patterns/ring/ring-units';
import { unitItem } from '../../../../shared/patterns/ring/unit-item';
import { fabricsAToZ } from '../../support/plans';

const wedgeFabrics = (count: number, dominant?: string) =>
  fabricsAToZ(count, dominant).slice(0, count);

describe('the order of fabrics', () => {
  it('moves the dominant one to the middle when a quarter is one odd round', () => {
    expect(fabricOrder(wedgeFabrics(5, 'B'), 20)).toEqual(['A', 'C', 'B', 'D', 'E']);
    expect(fabricOrder(wedgeFabrics(3, 'A'), 12)).toEqual(['B', 'A', 'C']);
    expect(fabricOrder(wedgeFabrics(5, 'C'), 20)).toEqual(['A', 'B', 'C', 'D', 'E']);
  });

  it('keeps the list otherwise', () => {
    expect(fabricOrder(wedgeFabrics(4, 'A'), 16)).toEqual(['A', 'B', 'C', 'D']);
    expect(fabricOrder(wedgeFabrics(5, 'A'), 40)).toEqual(['A', 'B', 'C', 'D', 'E']);
    expect(fabricOrder(wedgeFabrics(5), 20)).toEqual(['A', 'B', 'C', 'D', 'E']);
  });
});

describe('the fabrics around a ring', () => {
  it('repeat in rounds', () => {
    expect(ringLetters(['A', 'B', 'C', 'D'], 8).join('')).toBe('ABCDABCD');
  });

  it('change the last wedge when it would match the first', () => {
    expect(ringLetters(['A', 'B', 'C', 'D'], 9).join('')).toBe('ABCDABCDB');
    expect(ringLetters(['A', 'B', 'C', 'D', 'E'], 16).at(-1)).toBe('B');
  });

  it('cannot help two fabrics on an odd ring', () => {
    expect(ringLetters(['A', 'B'], 5).join('')).toBe('ABABA');
    expect(ringLetters(['A'], 5).join('')).toBe('AAAAA');
  });

  it('never match a neighbour, for three fabrics and more', () => {
    fc.assert(
      fc.property(fc.integer({ min: 3, max: 12 }), fc.integer({ min: 5, max: 60 }), (m, n) => {
        fc.pre(n >= m);
        const letters = ringLetters('ABCDEFGHIJKL'.slice(0, m).split(''), n);
        return letters.every((letter, index) => letter !== letters[(index + 1) % n]);
      }),
    );
  });
});

/** "(A+C)" for a pair, "[…]" for a quarter or half. */
function draw(unit: RingUnit): string {
  if (unit.kind === 'single') return unit.letters[0] ?? '';
  const inside = unit.parts.map(draw).join('');
  return unit.kind === 'pair' ? `(${inside})` : unit.kind === 'ring' ? inside : `[${inside}]`;
}

describe('the units of a ring', () => {
  it.each([
    [
      'five to a quarter: the single in the middle',
      20,
      '[[(AB)C(DE)][(FG)H(IJ)]][[(KL)M(NO)][(PQ)R(ST)]]',
    ],
    ['three to a quarter: the single last', 12, '[[(AB)C][(DE)F]][[(GH)I][(JK)L]]'],
    ['four to a quarter', 16, '[[(AB)(CD)][(EF)(GH)]][[(IJ)(KL)][(MN)(OP)]]'],
    ['halves of 9: the single in the middle', 18, '[(AB)(CD)E(FG)(HI)][(JK)(LM)N(OP)(QR)]'],
    ['halves of 4 and 3', 7, '[(AB)(CD)][(EF)G]'],
    ['two to a quarter: a pair is one already', 8, '[(AB)(CD)][(EF)(GH)]'],
    ['halves of 3 and 2: a pair is a half already', 5, '[(AB)C](DE)'],
  ])('with %s', (_says, n, drawing) => {
    expect(draw(ringUnits('ABCDEFGHIJKLMNOPQRST'.slice(0, n).split('')))).toBe(drawing);
  });

  it('hold every wedge once, in ring order', () => {
    for (let n = 5; n <= 60; n += 1) {
      const letters = Array.from({ length: n }, (_, index) => `W${index}`);
      const leaves = (unit: RingUnit): string[] =>
        unit.kind === 'single' ? unit.letters : unit.parts.flatMap(leaves);
      expect(leaves(ringUnits(letters))).toEqual(letters);
    }
  });

  it('are named by their fabrics, halves only when they differ', () => {
    const alike = ringUnits('ABCDABCD'.repeat(2).split(''));
    expect(unitItem(alike, alike, 'tip')).toBe('ring');
    expect(alike.parts.map((half) => unitItem(half, alike, 'tip'))).toEqual(['half', 'half']);
    const odd = ringUnits('ABCABCA'.split(''));
    expect(odd.parts.map((half) => unitItem(half, odd, 'tip'))).toEqual([
      'half:A+B+C+A',
      'half:B+C+A',
    ]);
    const [single] = ringUnits('ABC'.repeat(4).split('')).parts[0]?.parts[0]?.parts.slice(1) ?? [];
    expect(single && unitItem(single, alike, 'wedge')).toBe('wedge:C');
  });
});
