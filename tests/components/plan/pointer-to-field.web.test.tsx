import { findFirstError } from '@/components/plan/field-names';
import { pointerToField } from '@/components/plan/pointer-to-field';

describe('pointerToField', () => {
  it.each([
    ['/block', 'block'],
    ['/blocks', 'blocks'],
    ['/wedges', 'wedges'],
    ['/seam', 'seam'],
    ['/tip/seam', 'seam'],
    ['/tip/turnUnder', 'tip'],
    ['/narrowAt', 'narrowAt'],
    ['/stripHeight', 'stripHeight'],
    ['/centre/fabric', 'circleFabric'],
    ['/centre/overlap', 'overlap'],
    ['/centre/turning', 'centre'],
    ['/centre/turnUnder', 'centre'],
    ['/background/fabric', 'fabrics'],
    ['/background/trimAllowance', 'trimAllowance'],
    ['/cloth/usableWidth', 'usableWidth'],
    ['/cloth/shrinkPercent', 'shrinkPercent'],
    ['/cutting/bladeMm', 'bladeMm'],
    ['/cutting/cap', 'cap'],
    ['/cutting/layers', 'layers'],
    ['/fabrics', 'fabrics'],
    ['/fabrics/0', 'fabric:0'],
    ['/fabrics/11/name', 'fabric:11'],
    ['/fabrics/2/buyYards', 'fabric:2'],
  ])('puts %s beside %s', (pointer, field) => {
    expect(pointerToField(pointer)).toBe(field);
  });

  it.each(['', '/cutting/squaringOff', '/fabrics/x/name', '/blocksize'])(
    'leaves %p to the whole form',
    (pointer) => {
      expect(pointerToField(pointer)).toBe('form');
    },
  );
});

describe('findFirstError', () => {
  it('finds the first wrong field in reading order', () => {
    expect(findFirstError({ seam: 'x', wedges: 'x', 'fabric:3': 'x' })).toBe('wedges');
    expect(findFirstError({ seam: 'x', 'fabric:3': 'x' })).toBe('fabric:3');
    expect(findFirstError({})).toBeNull();
  });
});
