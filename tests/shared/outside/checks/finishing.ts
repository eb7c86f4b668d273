import { Fraction } from 'fraction.js';

import { inchesAfterWash } from '../../../../shared/cutting/yards-to-buy';
import { backingPanels } from '../../../../shared/finishing/backing-panels';
import { battingPackage } from '../../../../shared/finishing/batting-package';
import { biasSquareSide } from '../../../../shared/finishing/bias-square-side';
import { bindingCloth } from '../../../../shared/finishing/binding-cloth';
import { bindingLength } from '../../../../shared/finishing/binding-length';
import { bindingStrips } from '../../../../shared/finishing/binding-strips';
import { bindingStripsUnjoined } from '../../../../shared/finishing/binding-strips-unjoined';
import { borderLengths } from '../../../../shared/finishing/border-lengths';
import { joinedStrips } from '../../../../shared/finishing/joined-strips';
import type { Size } from '../../../../shared/finishing/size';
import {
  BACKING_OVERHANG,
  BATTING_OVERHANG,
  withOverhang,
} from '../../../../shared/finishing/with-overhang';
import { toText } from '../../../../shared/units/fraction';
import type { Checks } from '../rows';

const inches = (value: string | number) => new Fraction(value);
const sized = (width: number | string, height: number | string): Size => ({
  width: inches(width),
  height: inches(height),
});

/** A binding's figures as text. */
function binding(width: number, height: number, stripWidth: string, usableWidth: number) {
  const cloth = bindingCloth(sized(width, height), inches(stripWidth), inches(usableWidth));
  const { length, strips, unjoined, bindingLeft, needs, buyYards, spare } = cloth;
  return {
    length: toText(length),
    strips,
    unjoined,
    bindingLeft: toText(bindingLeft),
    needs: toText(needs),
    buyYards: toText(buyYards),
    spare: toText(spare),
  };
}

const backing = (width: number, height: number) => {
  const size = withOverhang(sized(width, height), BACKING_OVERHANG);
  return [toText(size.width), toText(size.height)];
};

/** Panels and yards both ways, for a quilt with the usual overhang on 42-inch cloth. */
function panels(width: number, height: number) {
  const size = withOverhang(sized(width, height), BACKING_OVERHANG);
  return (['upright', 'level'] as const).map((run) => {
    const { panels: count, buyYards } = backingPanels(size, inches(42), run);
    return [count, toText(buyYards)];
  });
}

const packageFor = ([width, height]: readonly [number, number]) =>
  battingPackage(withOverhang(sized(width, height), BATTING_OVERHANG));

const bindingChecks: Checks = {
  'binding.60x80-at-40': () =>
    expect(binding(60, 80, '5/2', 40)).toMatchObject({
      length: '290',
      strips: 8,
      needs: '20',
      buyYards: '5/8',
    }),

  'binding.60x80-at-42': () =>
    expect(binding(60, 80, '5/2', 42)).toMatchObject({ length: '290', unjoined: 7, strips: 8 }),

  'binding.50x65-at-40': () => {
    const ours = binding(50, 65, '9/4', 40);
    expect(ours).toMatchObject({
      length: '240',
      unjoined: 6,
      strips: 7,
      needs: '63/4',
      buyYards: '1/2',
    });
    // six unjoined strips are 240 exactly: no slack at all, and joined they are too short
    const joined = joinedStrips(6, inches(40), inches('9/4'));
    expect(toText(joined)).toBe('915/4');
    expect(joined.lt(ours.length)).toBe(true);
  },

  'binding.50x65-at-42': () =>
    expect(binding(50, 65, '9/4', 42)).toMatchObject({
      strips: 6,
      bindingLeft: '3/4', // under an inch: one warning
      needs: '27/2',
      buyYards: '3/8',
      spare: '0', // none: the other
    }),

  'binding.46x46': () => {
    expect(bindingLength(sized(46, 46)).div(42).valueOf()).toBeCloseTo(4.6, 1);
    expect(binding(46, 46, '5/2', 42)).toMatchObject({ strips: 5, unjoined: 5, needs: '25/2' });
  },

  // 38 inches of each strip count once its join is off; the source adds nothing for corners
  'binding.50x60': () => {
    expect(bindingStripsUnjoined(inches(2 * (50 + 60)), inches(38))).toBe(6);
    const width = inches('5/2');
    expect(bindingStrips(bindingLength(sized(50, 60)), width.add(38), width)).toBe(6);
  },

  'binding.bias': () => expect(biasSquareSide(inches(250), inches(2))).toBe(23),

  'binding.bias-610': () => {
    const [length, width] = [inches(244), inches('5/2')];
    expect(toText(length.mul(width))).toBe('610');
    expect(biasSquareSide(length, width)).toBe(25); // the inch above 24.7
  },
};

const layerChecks: Checks = {
  'borders.48x60': () => {
    const seam = inches('1/4');
    const { sides, topAndBottom, raw } = borderLengths(sized('97/2', '121/2'), inches(4), seam);
    expect([sides, topAndBottom].map(toText)).toEqual(['121/2', '113/2']);
    expect([raw.width.sub('1/2'), raw.height.sub('1/2')].map(toText)).toEqual(['56', '68']);
  },

  'backing.60x80': () => {
    expect(backing(60, 80)).toEqual(['68', '88']);
    const { width, height } = withOverhang(sized(60, 80), BATTING_OVERHANG);
    expect([toText(width), toText(height)]).toEqual(['66', '86']);
  },
  'backing.40x60': () => expect(backing(40, 60)).toEqual(['48', '68']),
  'backing.60x80-again': () => expect(backing(60, 80)).toEqual(['68', '88']),
  'backing.60x70': () => expect(backing(60, 70)).toEqual(['68', '78']),

  'panels.40x60': () =>
    expect(panels(40, 60)).toEqual([
      [2, '31/8'],
      [2, '11/4'],
    ]),
  'panels.60x80': () =>
    expect(panels(60, 80)).toEqual([
      [2, '5'],
      [3, '23/4'],
    ]),

  'batting.packages': () => {
    const sold = [
      [45, 60],
      [72, 90],
      [81, 96],
      [90, 108],
      [120, 120],
    ] as const;
    // each covers its own size, and an eighth more takes the next
    expect(sold.map(([width, height]) => battingPackage(sized(width, height)))).toEqual(sold);
    const wider = sold.map(([width, height]) =>
      battingPackage(sized(inches(width).add('1/8').toFraction(), height)),
    );
    expect(wider).toEqual([...sold.slice(1), null]);
  },

  'batting.shrink': () => {
    const after = (cut: number) => inchesAfterWash(inches(cut).div(36), inches(5));
    expect(after(95).gte(90)).toBe(true);
    expect(after(94).lt(90)).toBe(true);
  },

  // twin, XL twin, full, queen, king, California king; with 3 in on every side
  'beds.batting': () => {
    const beds = [
      [39, 75],
      [39, 80],
      [54, 75],
      [60, 80],
      [76, 80],
      [72, 84],
    ] as const;
    expect(beds.map(packageFor)).toEqual([
      [72, 90],
      [72, 90],
      [72, 90],
      [72, 90],
      [90, 108],
      [81, 96],
    ]);
  },

  'beds.other': () => {
    const beds = [
      [38, 75],
      [38, 80],
      [53, 75],
    ] as const;
    expect(beds.map(packageFor)).toEqual(beds.map(() => [72, 90]));
  },
};

/** Rows of bindings, borders, backings and battings. */
export const finishingChecks: Checks = { ...bindingChecks, ...layerChecks };
