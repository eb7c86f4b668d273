import type { TallyKey } from '../../shared/model/tally';
import type { ProjectView } from '../client/projects-client';
import type { Identity, Stamped } from '../merge/identity';
import type { FieldName } from '../merge/operation';
import type { TallyParts } from '../merge/tally';

/** One count, kept up to date with every act; `no` is its row in this file. */
export interface TallyRecord extends TallyParts {
  no: number;
  ruling: Stamped | null;
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
  /** the newest act that stands, by step */
  newest: ReadonlyMap<string, OwnAct>;
}

export const toUndoable = ({ step, lane, kind, delta, act, ord }: OwnAct) => ({
  step,
  lane,
  kind,
  delta,
  act,
  order: ord,
});
