import type { TallyKey } from '../../shared/model/tally';
import type { ProjectView } from '../client/projects-client';
import type { Identity, Stamped } from '../merge/identity';
import type { FieldName } from '../merge/operation';
import type { TallyParts } from '../merge/tally';

/** One count, kept up to date with every act; `no` is its row in this file. */
export interface TallyRecord extends TallyParts {
  no: number;
  ruling: Stamped | null;
  /** the newest act of this device on it that stands */
  newest: OwnAct | null;
}

/** An act of this device that undo can take back. */
export interface OwnAct extends Identity, TallyKey {
  ord: number;
  act: 'tap' | 'set';
  /** what it put on the shown count */
  delta: number;
}

/** A project in the leader's memory: what screens see, and what further acts must name. */
export interface ProjectRecord {
  view: ProjectView;
  deleted: boolean;
  /** XOR of the hashes of all edits seen */
  edits: string;
  fieldBase: Readonly<Record<FieldName, Stamped>>;
  /** by `nameTally` */
  tallies: ReadonlyMap<string, TallyRecord>;
}

/** This device's newest act of a step that stands. */
export function newestOf(tallies: ProjectRecord['tallies'], step: string): OwnAct | null {
  let best: OwnAct | null = null;
  for (const { newest } of tallies.values()) {
    if (newest?.step === step && newest.ord > (best?.ord ?? 0)) best = newest;
  }
  return best;
}

export const toUndoable = ({ step, lane, kind, delta, act, ord }: OwnAct) => ({
  step,
  lane,
  kind,
  delta,
  act,
  order: ord,
});
