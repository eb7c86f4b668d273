import { Fraction } from 'fraction.js';

import { InvariantError } from '../result';
import { upToEighth } from '../units/up-to-eighth';
import { piecesPerStrip } from './pieces-per-strip';
import { stripRun } from './strip-run';
import { stripsForCount } from './strips-for-count';
import { wedgesPerStrip } from './wedges-per-strip';

export interface WedgeLengthsInput {
  blocks: number;
  /** wedges of one fabric that a plate takes */
  perPlate: number;
  usableWidth: Fraction;
  squaringOff: Fraction;
  cutWideIn: number;
  pitchIn: number;
}

/** The lengths cut off the strips of one fabric: one in each stack. */
export interface WedgeLengths {
  strips: number;
  lengthsPerStrip: number;
  lengths: number;
  length: Fraction;
  /** wedges from one length; the last length gives `lastEach` */
  each: number;
  lastEach: number;
}

/**
 * Lengths for stacks that hold whole plates, as few as keep the fabric at its fewest strips
 * ⌈wedges/k⌉. Where no number of whole plates does, whole strips are stacked, k wedges each.
 *
 * @returns null when not one wedge fits across the cloth
 */
export function wedgeLengths(input: WedgeLengthsInput): WedgeLengths | null {
  const { blocks, perPlate, cutWideIn, pitchIn, usableWidth } = input;
  const perStrip = wedgesPerStrip(usableWidth.valueOf(), cutWideIn, pitchIn);
  if (perStrip === 0) return null;
  const total = blocks * perPlate;
  const fewest = stripsForCount(total, perStrip);
  for (let plates = 1; plates <= blocks && plates * perPlate <= perStrip; plates += 1) {
    const lengths = Math.ceil(blocks / plates);
    const cut = cutLength(input, plates * perPlate, lengths);
    if (Math.ceil(lengths / cut.lengthsPerStrip) === fewest) {
      return finish(total, plates * perPlate, { ...cut, strips: fewest, lengths });
    }
  }
  const wholeStrips = { strips: fewest, lengths: fewest, length: usableWidth, lengthsPerStrip: 1 };
  return finish(total, perStrip, wholeStrips);
}

function finish(
  total: number,
  each: number,
  cut: Omit<WedgeLengths, 'each' | 'lastEach'>,
): WedgeLengths {
  const lastEach = total - each * (cut.lengths - 1);
  if (lastEach < 1 || lastEach > each) throw new InvariantError('lengths do not hold the wedges');
  return { ...cut, each, lastEach };
}

/** Run + squaring off, up to the whole inch if that adds no strip, else to the eighth. */
function cutLength(
  { cutWideIn, pitchIn, squaringOff, usableWidth }: WedgeLengthsInput,
  wedges: number,
  lengths: number,
): { length: Fraction; lengthsPerStrip: number } {
  const exactIn = stripRun(wedges, cutWideIn, pitchIn) + squaringOff.valueOf();
  const eighths = upToEighth(exactIn);
  const lengthsPerStrip = piecesPerStrip(usableWidth, eighths);
  if (lengthsPerStrip === 0) return { length: usableWidth, lengthsPerStrip: 1 }; // a strip, uncut
  const inches = new Fraction(eighths.ceil());
  const perStripInches = piecesPerStrip(usableWidth, inches);
  const addsNone =
    perStripInches > 0 &&
    Math.ceil(lengths / perStripInches) === Math.ceil(lengths / lengthsPerStrip);
  if (addsNone) return { length: inches, lengthsPerStrip: perStripInches };
  return { length: eighths, lengthsPerStrip };
}
