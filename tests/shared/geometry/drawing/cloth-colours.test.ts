import { wcagContrast } from 'culori';
import * as fc from 'fast-check';

import {
  isDarkCloth,
  letterInk,
  printColour,
  wrongSide,
} from '../../../../shared/geometry/drawing/cloth-colours';

const colour = fc
  .integer({ min: 0, max: 0xffffff })
  .map((value) => `#${value.toString(16).padStart(6, '0').toUpperCase()}`);

describe('letterInk', () => {
  it('reads at 4.5:1 or more on any cloth', () => {
    fc.assert(fc.property(colour, (cloth) => wcagContrast(letterInk(cloth), cloth) >= 4.5));
  });
});

describe('printColour', () => {
  it('differs from any cloth, so that the print shows', () => {
    fc.assert(fc.property(colour, (cloth) => printColour(cloth) !== cloth));
  });

  it('is darker on a light cloth and lighter on a dark one', () => {
    const white = (hex: string) => wcagContrast(hex, '#FFFFFF');
    expect(white(printColour('#EFE5D0'))).toBeGreaterThan(white('#EFE5D0'));
    expect(white(printColour('#263C69'))).toBeLessThan(white('#263C69'));
  });
});

describe('wrongSide', () => {
  it('mixes 42 % white into the cloth', () => {
    // 0.58 · 134 + 0.42 · 255 = 185 = B9, and so on
    expect(wrongSide('#86AAB8')).toBe('#B9CED6');
    expect(wrongSide('#000000')).toBe('#6B6B6B');
  });
});

describe('isDarkCloth', () => {
  it('tells the cloths whose lines need a light halo', () => {
    expect(['#B04A37', '#263C69'].every(isDarkCloth)).toBe(true);
    expect(['#EFE5D0', '#E0AC35', '#86AAB8'].some(isDarkCloth)).toBe(false);
  });
});
