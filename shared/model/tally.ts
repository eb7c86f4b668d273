import type { Station, StepRole } from './codes';
import type { PlanLane } from './plan';

/**
 * Kinds of count. `done` and `unpicked` are counted in taps of a lane; `lost` in pieces of one
 * item ("wedge:D"), whose name then stands in the lane's place.
 */
export const TALLY_KINDS = ['done', 'unpicked', 'lost'] as const;
export type TallyKind = (typeof TALLY_KINDS)[number];

/** Where a count stands: step key, lane key (an item for `lost`) and kind. */
export interface TallyKey {
  step: string;
  lane: string;
  kind: TallyKind;
}

/** A count as shown, never below 0. Keys with a count of 0 may be left out. */
export interface Tally extends TallyKey {
  shown: number;
}

/** A lane opened after the plan was made, for recutting one fabric. */
export interface ExtraLane extends PlanLane {
  step: string;
}

export interface LaneProgress {
  lane: PlanLane;
  extra: boolean;
  /** taps that stand: done − unpicked, never below 0 */
  done: number;
  /** whole taps that what is on hand allows; null when the lane starts from cloth */
  possible: number | null;
  /** pieces or units one tap makes */
  perTap: number;
}

export interface StepProgress {
  key: string;
  role: StepRole;
  position: number;
  station: Station;
  /** pieces or units to make, lost ones made again included */
  target: number;
  /** pieces or units made, lost ones included */
  made: number;
  lost: number;
  /** made − lost, never below 0 */
  good: number;
  /** still to make: planned target − good, never below 0 */
  toGo: number;
  /** pieces or units that what is on hand allows now, at most `toGo`; all of `toGo` from cloth */
  ready: number;
  /** units made beyond what their inputs allow: "2 more than were cut" */
  outrun: number;
  lanes: LaneProgress[];
  /** the items that hold the step back when `ready` is 0, and how many of each are missing */
  waitingFor: { item: string; missing: number }[];
}

export interface ItemProgress {
  item: string;
  made: number;
  lost: number;
  used: number;
  /** made − lost − used; fractions of a strip or stack as a decimal; may be negative (outrun) */
  onHand: number;
}

export interface Progress {
  steps: StepProgress[];
  items: ItemProgress[];
}
