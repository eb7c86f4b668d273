import { Fraction } from 'fraction.js';

import { wedgeLengths, type WedgeLengthsInput } from '../../../shared/cutting/wedge-lengths';
import { toText } from '../../../shared/units/fraction';

/** The 12-inch plate: k = 25 on 42 inches. */
const input: WedgeLengthsInput = {
  blocks: 5,
  perPlate: 4,
  usableWidth: new Fraction(42),
  squaringOff: new Fraction('1/2'),
  cutWideIn: 2.248461406,
  pitchIn: 1.614923645,
};

function lengthsOf(changes: Partial<WedgeLengthsInput>) {
  const cut = wedgeLengths({ ...input, ...changes });
  return cut && { ...cut, length: toText(cut.length) };
}

describe('lengths cut off strips', () => {
  it('are one a plate while that keeps the fewest strips, up to the whole inch', () => {
    // run of 4: 2.248461 + 3 × 1.614924 = 7.093232, + ½ → 7⅝ → 8; five of 8 fit into 42
    expect(lengthsOf({})).toEqual({
      strips: 1,
      lengthsPerStrip: 5,
      lengths: 5,
      length: '8',
      each: 4,
      lastEach: 4,
    });
  });

  it('stay at the eighth where the whole inch would add a strip', () => {
    // five of 7⅝ are 38⅛: they fit into 39, five of 8 do not
    expect(lengthsOf({ usableWidth: new Fraction(39) })).toMatchObject({
      strips: 1,
      lengthsPerStrip: 5,
      length: '61/8',
    });
  });

  it('hold more plates where one a plate would add a strip', () => {
    // 24 wedges of 25 a strip: six of 7⅝ do not fit, three of two plates (14⅛ each) do not,
    // two of three plates (20⅝, so 21) do
    expect(lengthsOf({ blocks: 6 })).toEqual({
      strips: 1,
      lengthsPerStrip: 2,
      lengths: 2,
      length: '21',
      each: 12,
      lastEach: 12,
    });
  });

  it('leave the last one fewer wedges where the plates do not share out', () => {
    // 42 wedges are two strips: seven of 10⅞ would take three, four of 20⅝ take two
    expect(lengthsOf({ blocks: 7, perPlate: 6 })).toEqual({
      strips: 2,
      lengthsPerStrip: 2,
      lengths: 4,
      length: '21',
      each: 12,
      lastEach: 6,
    });
  });

  it('are whole strips where no number of plates keeps the fewest strips', () => {
    // 20 a plate, 25 a strip: one plate a strip would take five strips for 100 wedges
    expect(lengthsOf({ perPlate: 20 })).toEqual({
      strips: 4,
      lengthsPerStrip: 1,
      lengths: 4,
      length: '42',
      each: 25,
      lastEach: 25,
    });
  });

  it('are a strip as it is where squaring both ends would not leave room', () => {
    expect(lengthsOf({ blocks: 1, perPlate: 25 })).toMatchObject({ length: '42', each: 25 });
  });

  it('are none where not one wedge fits', () => {
    expect(lengthsOf({ usableWidth: new Fraction(2) })).toBeNull();
  });
});
