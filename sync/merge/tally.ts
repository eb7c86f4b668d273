import type { TallyKey } from '../../shared/model/tally';

/** Sum of taps less undone ones, and the offset of the ruling set (0 when there is none). */
export interface TallyParts {
  tapPart: number;
  offset: number;
}

/** The count as people see it; the tally itself may be negative for a while. */
export const shownTally = ({ tapPart, offset }: TallyParts) => Math.max(0, tapPart + offset);

/** What a set keeps of "make it `want`": taps that arrive later still count on top. */
export const setOffset = (want: number, tapPart: number) => want - tapPart;

/** One text for a tally key, to index by. A tab stands in no key. */
export const nameTally = ({ step, lane, kind }: TallyKey) => `${step}\t${lane}\t${kind}`;
