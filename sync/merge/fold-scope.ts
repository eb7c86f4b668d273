import type { ExtraLane, TallyKey } from '../../shared/model/tally';
import { compareStamped, nameIdentity, type Stamped } from './identity';
import { hashIdentity, NO_EDITS, xorHashes } from './identity-hash';
import { FIELDS, type Act, type FieldName, type Operation } from './operation';
import { findRuling, type BasedWrite } from './ruling';
import { nameTally, type TallyParts } from './tally';

type Done<Kind extends Act['kind']> = Stamped & { act: Extract<Act, { kind: Kind }> };

export interface FoldedTally extends TallyKey, TallyParts {}

/** What all operations of one scope add up to, whatever the order they came in. */
export interface FoldedScope {
  begun: Done<'project'>['act'] | null;
  fields: Record<FieldName, string>;
  lanes: ExtraLane[];
  tallies: Map<string, FoldedTally>;
  deleted: boolean;
  workedAtMs: number | null;
  lastStepKey: string | null;
}

/** The meaning of a scope's operations, recomputed from nothing: what every other view must equal. */
export function foldScope(operations: readonly Operation[]): FoldedScope {
  const distinct = new Map(operations.map((operation) => [nameIdentity(operation), operation]));
  const all = [...distinct.values()].map(toStamped).sort(compareStamped);
  const begun = pick(all, 'project').at(-1)?.act ?? null;
  const counts = all.filter(isCount);
  const last = counts.at(-1);
  return {
    begun,
    fields: foldFields(all),
    lanes: foldLanes(all),
    tallies: foldTallies(all),
    deleted: isDeleted(all),
    workedAtMs: last?.stampMs ?? null,
    lastStepKey: last?.act.step ?? null,
  };
}

const toStamped = ({ session, seq, timeMs, act }: Operation): Stamped & { act: Act } => ({
  session,
  seq,
  stampMs: timeMs,
  act,
});

const pick = <Kind extends Act['kind']>(all: readonly (Stamped & { act: Act })[], kind: Kind) =>
  all.filter((one): one is Done<Kind> => one.act.kind === kind);

const isCount = (one: Stamped & { act: Act }): one is Done<'tap' | 'undo' | 'set'> =>
  one.act.kind === 'tap' || one.act.kind === 'undo' || one.act.kind === 'set';

/** The first of several lanes of one name; they are rows of their own, not edits of the project. */
function foldLanes(all: readonly (Stamped & { act: Act })[]): ExtraLane[] {
  const lanes = new Map<string, ExtraLane>();
  for (const { act } of pick(all, 'lane')) {
    const name = `${act.step}\t${act.lane.key}`;
    if (!lanes.has(name)) lanes.set(name, { ...act.lane, step: act.step });
  }
  return [...lanes.values()];
}

function foldTallies(all: readonly (Stamped & { act: Act })[]): Map<string, FoldedTally> {
  const undone = new Set(pick(all, 'undo').map(({ act }) => nameIdentity(act.target)));
  const tallies = new Map<string, FoldedTally>();
  const sets = new Map<string, (BasedWrite & { offset: number })[]>();
  for (const one of all.filter(isCount)) {
    const { step, lane, tally } = one.act;
    const key = { step, lane, kind: tally };
    const name = nameTally(key);
    const entry = tallies.get(name) ?? { ...key, tapPart: 0, offset: 0 };
    tallies.set(name, entry);
    if (one.act.kind === 'tap' && !undone.has(nameIdentity(one))) entry.tapPart += one.act.delta;
    if (one.act.kind === 'set') {
      const { base, offset } = one.act;
      sets.set(name, [...(sets.get(name) ?? []), { ...one, base, offset }]);
    }
  }
  for (const [name, writes] of sets) {
    const entry = tallies.get(name);
    if (entry) entry.offset = findRuling(writes, undone)?.offset ?? 0;
  }
  return tallies;
}

function foldFields(all: readonly (Stamped & { act: Act })[]): Record<FieldName, string> {
  const valueOf = (field: FieldName) => {
    const first = pick(all, 'project').map((one) => ({
      ...one,
      base: null,
      value: one.act[field],
    }));
    const later = pick(all, 'field')
      .filter(({ act }) => act.field === field)
      .map((one) => ({ ...one, base: one.act.base, value: one.act.value }));
    return findRuling<BasedWrite & { value: string }>([...first, ...later])?.value ?? '';
  };
  const [name, note] = FIELDS.map(valueOf);
  return { name: name ?? '', note: note ?? '' };
}

/** Gone if and only if some deleter had seen every edit of the row. */
function isDeleted(all: readonly (Stamped & { act: Act })[]): boolean {
  const edits = all
    .filter(({ act }) => act.kind === 'project' || act.kind === 'field' || act.kind === 'restore')
    .reduce((sum, one) => xorHashes(sum, hashIdentity(one)), NO_EDITS);
  return pick(all, 'delete').some(({ act }) => act.seen === edits);
}
