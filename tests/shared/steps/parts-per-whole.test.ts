import { InvariantError } from '../../../shared/result';
import { inParts, partsPerWhole } from '../../../shared/steps/parts-per-whole';

describe('partsPerWhole', () => {
  it('is the least number in which every use is whole', () => {
    expect(partsPerWhole([])).toBe(1);
    expect(partsPerWhole([{ consumes: { 'tip:A': 2 } }])).toBe(1);
    expect(partsPerWhole([{ consumes: { 'strip:A': '1/3' } }])).toBe(3);
    const uses = [{ consumes: { a: '1/4' } }, { consumes: { b: '1/6', c: '5/3' } }];
    expect(partsPerWhole(uses)).toBe(12);
    for (const { consumes } of uses) {
      for (const used of Object.values(consumes)) {
        expect(Number.isInteger(inParts(used, 12))).toBe(true);
      }
    }
  });
});

describe('inParts', () => {
  it('counts a fraction or a whole in parts', () => {
    expect(inParts('2/3', 6)).toBe(4);
    expect(inParts('5', 6)).toBe(30);
    expect(inParts(2, 12)).toBe(24);
  });

  it('reads nothing but fractions', () => {
    expect(() => inParts('a/3', 6)).toThrow(InvariantError);
  });
});
