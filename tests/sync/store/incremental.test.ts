import * as fc from 'fast-check';

import { foldScope } from '../../../sync/merge/fold-scope';
import { shownTally } from '../../../sync/merge/tally';
import type { Command } from '../../../sync/store/command';
import { openStore } from '../../../sync/store/open-store';
import { loadState } from '../../../sync/store/read/load-state';
import { readOperations } from '../../../sync/store/read/read-operations';
import { openNodeDatabase } from '../../support/open-node-database';
import { CUT, cutKey, handRequest, handTools, otherPairKey, PAIR, pairKey } from './hand-plan';

jest.setTimeout(60_000);
const id = 'p1';
const key = fc.constantFrom(cutKey, pairKey, otherPairKey);
const command: fc.Arbitrary<Command> = fc.oneof(
  {
    weight: 5,
    arbitrary: fc
      .record({ key, delta: fc.integer({ min: -2, max: 5 }) })
      .map((tap) => ({ do: 'tap' as const, id, ...tap })),
  },
  {
    weight: 2,
    arbitrary: fc
      .record({ key, want: fc.nat(20) })
      .map((set) => ({ do: 'set' as const, id, ...set })),
  },
  {
    weight: 3,
    arbitrary: fc.subarray([CUT, PAIR]).map((steps) => ({ do: 'undo' as const, id, steps })),
  },
  fc.string({ unit: 'binary' }).map((name) => ({ do: 'rename' as const, id, name })),
  fc.constant({ do: 'remove' as const, id }),
  fc.constant({ do: 'restore' as const, id }),
);
/** Opened anew on the same file, in the middle of it. */
const REOPEN = 'reopen';
const acts = fc.array(fc.oneof({ weight: 12, arbitrary: command }, fc.constant(REOPEN)), {
  maxLength: 30,
});

/** The schema as it was before counts kept their newest act, with the data as it is. */
const WITHOUT_NEWEST = `
  DROP INDEX request_by_time;
  ALTER TABLE view_tally DROP COLUMN newest_ord;
  PRAGMA user_version = 1`;

it('keeps a view that equals all operations added up anew, and what a reopening reads', async () => {
  await fc.assert(
    fc.asyncProperty(acts, async (commands) => {
      const db = openNodeDatabase(':memory:');
      let store = await openStore(db, handTools());
      await store.perform(null, { do: 'create', id, name: 'P', note: '', request: handRequest });
      for (const one of commands) {
        if (one === REOPEN) store = await openStore(db, handTools());
        else await store.perform(null, one as Command);
      }
      const folded = foldScope(await readOperations(db));
      const record = (await loadState(db)).records.get(id);
      const view = store.projects()[0];
      expect(view === undefined).toBe(folded.deleted);
      expect(record?.deleted).toBe(folded.deleted);
      if (view) expect(record?.view).toEqual({ ...view, undoable: expect.anything() });
      if (view) expect(new Set(record?.view.undoable)).toEqual(new Set(view.undoable));
      expect(record?.view).toMatchObject({
        workedAtMs: folded.workedAtMs,
        lastStepKey: folded.lastStepKey,
      });
      const counts = [...folded.tallies.values()].map((tally) => [
        tally.step,
        tally.lane,
        shownTally(tally),
      ]);
      const kept = record?.view.tallies.map((tally) => [tally.step, tally.lane, tally.shown]);
      expect(kept?.sort()).toEqual(counts.sort());
      await db.exec(WITHOUT_NEWEST);
      const upgraded = await openStore(db, handTools());
      expect(upgraded.projects()).toEqual(record?.deleted ? [] : [record?.view]);
      await upgraded.close();
    }),
    { numRuns: 60 },
  );
});
