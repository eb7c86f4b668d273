import * as fc from 'fast-check';

import { foldScope } from '../../../sync/merge/fold-scope';
import { hashIdentity, NO_EDITS, xorHashes } from '../../../sync/merge/identity-hash';
import type { Act, Operation } from '../../../sync/merge/operation';
import { shownTally } from '../../../sync/merge/tally';
import { handRequest } from '../store/hand-plan';

const SESSIONS = ['a', 'b', 'c'].map((letter) => letter.repeat(32));
const key = { step: 'cut', lane: 'A', tally: 'done' } as const;
const NAME = 'cut\tA\tdone';

const operation = (session: string, seq: number, timeMs: number, act: Act): Operation => ({
  scope: 's',
  session,
  seq,
  timeMs,
  act,
});
const [one = '', two = ''] = SESSIONS;
const begin: Act = {
  kind: 'project',
  name: 'Plate',
  note: '',
  example: false,
  request: handRequest,
  engine: '1.0.0',
  steps: [],
};
const tap = (delta: number): Act => ({ kind: 'tap', ...key, delta });
const undo = (session: string, seq: number, delta: number): Act => ({
  kind: 'undo',
  ...key,
  target: { session, seq },
  delta,
});
const set = (want: number, offset: number, base: { session: string; seq: number } | null): Act => ({
  kind: 'set',
  ...key,
  want,
  offset,
  base,
});
const shown = (operations: Operation[]) => {
  const tally = foldScope(operations).tallies.get(NAME);
  return tally ? shownTally(tally) : 0;
};

// Acts of three devices that have seen anything at all of each other: each picks its target or base
// among what came before it, wherever that was written.
const acts = fc
  .array(
    fc.record({
      who: fc.nat(2),
      what: fc.constantFrom('tap', 'undo', 'set', 'name', 'delete', 'restore'),
      n: fc.integer({ min: -3, max: 9 }),
      at: fc.integer({ min: 1, max: 50 }),
      pick: fc.nat(),
    }),
    { maxLength: 25 },
  )
  .map((draws) => {
    const seqs = [1, 0, 0];
    const made = [operation(one, 1, 1, begin)];
    for (const { who, what, n, at, pick } of draws) {
      const session = SESSIONS[who] ?? one;
      const seq = (seqs[who] = (seqs[who] ?? 0) + 1);
      const of = (kind: string) => {
        const all = made.filter(({ act }) => act.kind === kind);
        return all[pick % Math.max(1, all.length)];
      };
      const named = (other: Operation | undefined) =>
        other ? { session: other.session, seq: other.seq } : null;
      const target = of(pick % 2 ? 'tap' : 'set') ?? of('tap');
      const act: Act | null =
        what === 'tap'
          ? tap(n)
          : what === 'set'
            ? set(Math.abs(n), n, named(of('set')))
            : what === 'undo' && target
              ? undo(target.session, target.seq, 'delta' in target.act ? -target.act.delta : 0)
              : what === 'name'
                ? {
                    kind: 'field',
                    field: 'name',
                    value: `${n}`,
                    base: named(of('field')) ?? { session: one, seq: 1 },
                  }
                : what === 'delete'
                  ? {
                      kind: 'delete',
                      seen: pick % 2 ? hashIdentity({ session: one, seq: 1 }) : NO_EDITS,
                    }
                  : what === 'restore'
                    ? { kind: 'restore' }
                    : null;
      if (act) made.push(operation(session, seq, at, act));
      else seqs[who] = seq - 1;
    }
    return made;
  });

it('comes to the same whatever the order, and however often each act arrives', () => {
  const shuffled = acts.chain((all) =>
    fc.record({
      all: fc.constant(all),
      other: fc.shuffledSubarray([...all, ...all], { minLength: all.length * 2 }),
    }),
  );
  fc.assert(
    fc.property(shuffled, ({ all, other }) => {
      expect(foldScope(other)).toEqual(foldScope(all));
    }),
    { numRuns: 200 },
  );
});

it('counts a tap once unless it is undone, and n undos as one', () => {
  const taps = [operation(one, 1, 1, tap(1)), operation(one, 2, 2, tap(4))];
  expect(shown(taps)).toBe(5);
  const undos = [1, 2, 3].map((seq) => operation(two, seq, 9 + seq, undo(one, 2, -4)));
  fc.assert(
    fc.property(fc.subarray(undos, { minLength: 1 }), (some) => {
      expect(shown([...some, ...taps])).toBe(1);
    }),
  );
});

it('lets an undo wait for its target', () => {
  const early = operation(two, 1, 9, undo(one, 2, -4));
  expect(shown([operation(one, 1, 1, tap(1)), early])).toBe(1);
  expect(shown([operation(one, 1, 1, tap(1)), early, operation(one, 2, 2, tap(4))])).toBe(1);
});

it('makes a set want, plus every tap and undo that it had not seen', () => {
  const seen = operation(one, 1, 1, tap(3));
  const fifty = operation(one, 2, 2, set(50, 47, null));
  expect(shown([seen, fifty])).toBe(50);
  expect(shown([seen, fifty, operation(two, 1, 1, tap(5))])).toBe(55);
  expect(shown([seen, fifty, operation(two, 1, 3, undo(one, 1, -3))])).toBe(47);
});

it('lets a set made on top of another win, whatever the clocks say', () => {
  const first = operation(one, 1, 900, set(10, 10, null));
  const onTop = operation(two, 1, 5, set(20, 20, { session: one, seq: 1 }));
  expect(shown([first, onTop])).toBe(20);
  const undone = operation(two, 2, 6, undo(two, 1, 0));
  expect(shown([first, onTop, undone])).toBe(10);
});

it('shows no count below nothing, and forgets nothing below it', () => {
  const low = [operation(one, 1, 1, tap(-2))];
  expect(shown(low)).toBe(0);
  expect(shown([...low, operation(two, 1, 1, tap(3))])).toBe(1);
});

it('deletes only if some deleter had seen every edit', () => {
  const made = operation(one, 1, 1, begin);
  const seen = hashIdentity({ session: one, seq: 1 });
  const gone = operation(one, 2, 2, { kind: 'delete', seen });
  const base = { session: one, seq: 1 };
  const edit = operation(two, 1, 3, { kind: 'field', field: 'name', value: 'Bowl', base });
  expect(foldScope([made, gone]).deleted).toBe(true);
  expect(foldScope([made, gone, edit])).toMatchObject({ deleted: false, fields: { name: 'Bowl' } });
  const both = xorHashes(seen, hashIdentity({ session: two, seq: 1 }));
  expect(
    foldScope([made, gone, edit, operation(two, 2, 4, { kind: 'delete', seen: both })]).deleted,
  ).toBe(true);
  expect(foldScope([made, gone, operation(two, 1, 9, tap(1))]).deleted).toBe(true);
});
