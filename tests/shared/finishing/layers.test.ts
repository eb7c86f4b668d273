import * as fc from 'fast-check';
import { Fraction } from 'fraction.js';

import { backingPanels } from '../../../shared/finishing/backing-panels';
import { battingPackage } from '../../../shared/finishing/batting-package';
import { borderLengths } from '../../../shared/finishing/border-lengths';
import { joinedWidth } from '../../../shared/finishing/joined-width';
import type { Size } from '../../../shared/finishing/size';
import { withOverhang } from '../../../shared/finishing/with-overhang';
import { toText } from '../../../shared/units/fraction';

const sized = (width: number | string, height: number | string): Size => ({
  width: new Fraction(width),
  height: new Fraction(height),
});

describe('a backing', () => {
  it('is larger on all four sides', () => {
    const { width, height } = withOverhang(sized(40, '121/2'), new Fraction('5/2'));
    expect([toText(width), toText(height)]).toEqual(['45', '131/2']);
  });

  it('as wide as the cloth is one panel, and an eighth wider two', () => {
    const usable = new Fraction(42);
    expect(backingPanels(sized(42, 50), usable, 'upright').panels).toBe(1);
    expect(backingPanels(sized('337/8', 50), usable, 'upright').panels).toBe(2);
    // two widths less an inch for the join
    expect(backingPanels(sized(83, 50), usable, 'upright').panels).toBe(2);
    expect(backingPanels(sized('665/8', 50), usable, 'upright').panels).toBe(3);
  });

  it('lies the other way when its panels are level', () => {
    const usable = new Fraction(42);
    const { panels, each, needs } = backingPanels(sized(48, 100), usable, 'level');
    expect([panels, toText(each), toText(needs)]).toEqual([3, '48', '144']);
    expect(backingPanels(sized(100, 48), usable, 'upright')).toEqual(
      backingPanels(sized(48, 100), usable, 'level'),
    );
  });
});

describe('a batting', () => {
  it('comes from the smallest package that covers it, either way round', () => {
    expect(battingPackage(sized(60, 45))).toEqual([45, 60]);
    expect(battingPackage(sized(45, 60))).toEqual([45, 60]);
    expect(battingPackage(sized('361/8', 60))).toEqual([72, 90]);
    expect(battingPackage(sized(96, 81))).toEqual([81, 96]);
    expect(battingPackage(sized(109, 90))).toEqual([120, 120]);
    expect(battingPackage(sized(100, 121))).toBeNull();
  });
});

describe('borders', () => {
  it('add their finished width on all sides, whatever the seam', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 8, max: 800 }),
        fc.integer({ min: 8, max: 100 }),
        fc.integer({ min: 1, max: 8 }),
        (side, border, seamEighths) => {
          const seam = new Fraction(seamEighths, 8);
          const finished = new Fraction(border, 8);
          const top = sized(new Fraction(side, 8).toFraction(), '60');
          const { raw, sides, topAndBottom, cutWidth } = borderLengths(top, finished, seam);
          expect(raw.width.sub(top.width).equals(finished.mul(2))).toBe(true);
          expect(raw.height.sub(top.height).equals(finished.mul(2))).toBe(true);
          expect(sides.equals(top.height)).toBe(true);
          expect(topAndBottom.equals(raw.width)).toBe(true);
          expect(cutWidth.equals(finished.add(seam).add(seam))).toBe(true);
        },
      ),
    );
  });
});

describe('pieces side by side', () => {
  it('keep the outer allowances: one piece is as it was cut', () => {
    expect(toText(joinedWidth(1, new Fraction('5/2'), new Fraction('1/4')))).toBe('5/2');
    expect(toText(joinedWidth(4, new Fraction('5/2'), new Fraction('3/8')))).toBe('31/4');
  });
});
