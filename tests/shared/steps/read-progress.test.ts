import * as fc from 'fast-check';

import type { StepRole } from '../../../shared/model/codes';
import type { Plan } from '../../../shared/model/plan';
import type { Tally } from '../../../shared/model/tally';
import { defaultRequest } from '../../../shared/plan/default-request';
import { readProgress } from '../../../shared/steps/read-progress';
import { recutLane } from '../../../shared/steps/recut-lane';
import { choices, fabricsAToZ, planOf } from '../support/plans';

const plan = planOf(
  defaultRequest(choices({ block: '16', wedges: 16, fabrics: fabricsAToZ(4), circleFabric: 'B' })),
);

function keyOf(role: StepRole, of: Plan = plan): string {
  return of.steps.find((step) => step.role === role)?.key ?? '';
}

function tally(role: StepRole, lane: string, shown: number, kind: Tally['kind'] = 'done'): Tally {
  return { step: keyOf(role), lane, kind, shown };
}

function allDone(of: Plan = plan): Tally[] {
  return of.steps.flatMap((step) =>
    step.lanes.map((lane): Tally => ({
      step: step.key,
      lane: lane.key,
      kind: 'done',
      shown: lane.target,
    })),
  );
}

function read(...tallies: Tally[]) {
  const progress = readProgress(plan.steps, [], tallies);
  return {
    at: (role: StepRole) => {
      const step = progress.steps.find((other) => other.role === role);
      if (!step) throw new Error(role);
      return step;
    },
    onHand: (item: string) => progress.items.find((other) => other.item === item)?.onHand,
  };
}

const CUT = 'A1+B1+C1+D1';

describe('before the first count', () => {
  it('everything cut from cloth is ready, and nothing else', () => {
    const { steps } = readProgress(plan.steps, [], []);
    const ready = steps.filter((step) => step.ready > 0).map((step) => [step.role, step.ready]);
    expect(ready).toEqual([
      ['strip', 4],
      ['circle-cut', 1],
      ['background-cut', 1],
    ]);
  });

  it('says what each step waits for', () => {
    expect(read().at('length').waitingFor).toContainEqual({ item: 'strip:A', missing: 1 });
    expect(read().at('pair').waitingFor).toEqual(
      ['A', 'B', 'C', 'D'].map((letter) => ({ item: `tip:${letter}`, missing: 4 })),
    );
  });

  it('knows no limit to a lane that starts from cloth', () => {
    expect(read().at('strip').lanes[0]?.possible).toBeNull();
    expect(read().at('length').lanes[0]?.possible).toBe(0);
  });
});

describe('taps', () => {
  const oneStrip = tally('strip', 'A', 1);

  it('take a third of a strip for a length, exactly', () => {
    const progress = read(oneStrip, tally('length', 'A', 1));
    expect(progress.onHand('strip:A')).toBeCloseTo(2 / 3, 12);
    expect(progress.at('length').lanes[0]?.possible).toBe(2);
    expect(read(oneStrip, tally('length', 'A', 3)).onHand('strip:A')).toBe(0);
    expect(read(oneStrip, tally('length', 'A', 3)).at('length').lanes[0]?.possible).toBe(0);
  });

  it('make a piece of every layer', () => {
    const progress = read(tally('cut', CUT, 3));
    expect(progress.at('cut')).toMatchObject({ made: 12, toGo: 4 });
    expect(progress.onHand('wedge:C')).toBe(3);
    expect(progress.at('tip-sew')).toMatchObject({ ready: 12 });
  });

  it('are the least that the inputs allow, rounded down', () => {
    const turned = [tally('tip-turn', 'A', 4), tally('tip-turn', 'B', 3)];
    const pair = read(...turned).at('pair');
    expect(pair.lanes.map(({ possible }) => possible)).toEqual([3, 0]);
    expect(pair).toMatchObject({ ready: 3, waitingFor: [] });
  });

  it('give their inputs back when units are unpicked', () => {
    const counts = [tally('tip-turn', 'A', 4), tally('tip-turn', 'B', 4), tally('pair', 'A+B', 3)];
    expect(read(...counts).onHand('tip:A')).toBe(1);
    const unpicked = read(...counts, tally('pair', 'A+B', 2, 'unpicked'));
    expect(unpicked.onHand('tip:A')).toBe(3);
    expect(unpicked.onHand('pair:A+B')).toBe(1);
    expect(unpicked.at('pair')).toMatchObject({ made: 1, toGo: 7 });
  });

  it('never stand below nought', () => {
    expect(read(tally('pair', 'A+B', 2, 'unpicked')).at('pair')).toMatchObject({
      made: 0,
      toGo: 8,
    });
  });
});

describe('a count that outruns its inputs', () => {
  it('is kept, and says by how many', () => {
    const progress = read(
      tally('tip-turn', 'A', 2),
      tally('tip-turn', 'B', 4),
      tally('pair', 'A+B', 4),
    );
    expect(progress.at('pair')).toMatchObject({ made: 4, outrun: 2 });
    expect(progress.onHand('tip:A')).toBe(-2);
    expect(progress.at('pair').lanes[0]?.possible).toBe(0);
  });

  it('counts pieces that were lost before as not there', () => {
    const progress = read(
      tally('tip-turn', 'A', 4),
      tally('tip-turn', 'B', 4),
      tally('tip-turn', 'tip:A', 1, 'lost'),
      tally('pair', 'A+B', 4),
    );
    expect(progress.at('pair')).toMatchObject({ made: 4, outrun: 1 });
  });

  it('is laid to the later step when two use the same item', () => {
    const mixed = planOf(defaultRequest(choices({ fabrics: fabricsAToZ(4) })));
    // five to a quarter from four fabrics: A is in pairs and, elsewhere, the single in the middle
    const turned = mixed.steps.find(({ role }) => role === 'tip-turn');
    const counts: Tally[] = allDone(mixed).map((count) =>
      count.step === turned?.key && count.lane === 'A' ? { ...count, shown: 4 } : count,
    );
    const { steps } = readProgress(mixed.steps, [], counts);
    const outrun = Object.fromEntries(steps.map((step) => [step.role, step.outrun]));
    expect(outrun).toMatchObject({ 'tip-turn': 0, pair: 0, quarter: 1, half: 0 });
  });
});

describe('lost pieces', () => {
  it('are made again, and count among what was made', () => {
    const progress = read(tally('cut', CUT, 4), tally('cut', 'wedge:D', 2, 'lost'));
    expect(progress.at('cut')).toMatchObject({ target: 18, made: 16, lost: 2, good: 14, toGo: 2 });
    expect(progress.at('cut').ready).toBe(2); // from cloth, no stack is needed
    expect(progress.onHand('wedge:D')).toBe(2);
  });

  it('that take a part of a strip ask for a whole strip, unless one has enough left', () => {
    // three lengths to a strip: three plates use it up, one plate leaves two thirds
    const counts = (of: Plan): Tally[] => [
      { step: keyOf('strip', of), lane: 'A', kind: 'done', shown: 1 },
      { step: keyOf('length', of), lane: 'A', kind: 'done', shown: of === plan ? 1 : 3 },
      { step: keyOf('length', of), lane: 'length:A', kind: 'lost', shown: 1 },
    ];
    const sizes = { block: '16', wedges: 16, blocks: 3, fabrics: fabricsAToZ(4) };
    const three = planOf(defaultRequest(choices(sizes)));
    const stripsOf = (of: Plan) => readProgress(of.steps, [], counts(of)).steps[0];
    expect(stripsOf(three)).toMatchObject({ role: 'strip', target: 5, toGo: 4 });
    expect(stripsOf(plan)).toMatchObject({ role: 'strip', target: 4, toGo: 3 });
  });

  it('farther on ask for all that they were made of', () => {
    const counts = allDone().filter(
      ({ step }) => step !== keyOf('quarter') && step !== keyOf('half'),
    );
    const before = counts.filter(({ step }) =>
      plan.steps.slice(0, 8).some((early) => early.key === step),
    );
    const progress = read(...before, tally('pair', 'pair:A+B', 1, 'lost'));
    expect(progress.at('pair')).toMatchObject({ lost: 1, good: 7, toGo: 1, ready: 0 });
    expect(progress.at('pair').waitingFor).toEqual([
      { item: 'tip:A', missing: 1 },
      { item: 'tip:B', missing: 1 },
    ]);
    expect(progress.at('tip-turn')).toMatchObject({ lost: 0, toGo: 2 });
    expect(progress.at('tip-sew')).toMatchObject({ toGo: 2 });
    expect(progress.at('cut')).toMatchObject({ target: 18, made: 16, good: 16, toGo: 2, ready: 2 });
    expect(progress.at('stack')).toMatchObject({ toGo: 0 });
  });

  it('of a fabric that has wedges to spare need no recutting', () => {
    const spare = planOf(defaultRequest(choices({ wedges: 18, fabrics: fabricsAToZ(4) })));
    const lost: Tally = { step: keyOf('cut', spare), lane: 'wedge:D', kind: 'lost', shown: 1 };
    const cut = (count: number) =>
      readProgress(spare.steps, [], [...allDone(spare), { ...lost, shown: count }]).steps.find(
        ({ role }) => role === 'cut',
      );
    expect(cut(1)).toMatchObject({ lost: 1, toGo: 0 });
    expect(cut(2)).toMatchObject({ lost: 2, toGo: 1 });
  });
});

describe('a lane for recutting', () => {
  it('has another key than a stack of that one fabric', () => {
    const single = planOf(defaultRequest(choices({ fabrics: fabricsAToZ(1) })));
    expect(recutLane(single, 'A', 2)).toMatchObject({ key: 'A1 again', target: 2 });
    expect(recutLane(plan, 'A', 2).key).toBe('A1');
  });
});

describe('any counts at all', () => {
  const lanes = plan.steps.flatMap((step) =>
    step.lanes.map((lane) => ({ step: step.key, lane: lane.key })),
  );
  const items = plan.steps.flatMap((step) =>
    step.lanes.flatMap((lane) =>
      Object.keys(lane.makes).map((item) => ({ step: step.key, lane: item })),
    ),
  );
  const shown = fc.nat({ max: 12 });
  const counted = fc.uniqueArray(
    fc.oneof(
      fc.record({
        at: fc.constantFrom(...lanes),
        kind: fc.constantFrom('done', 'unpicked'),
        shown,
      }),
      fc.record({ at: fc.constantFrom(...items), kind: fc.constant('lost' as const), shown }),
    ),
    { selector: ({ at, kind }) => `${at.step} ${at.lane} ${kind}` },
  );

  it('balance: on hand = made − lost − used, and what is possible is on hand', () => {
    fc.assert(
      fc.property(counted, (counts) => {
        const tallies = counts.map(({ at, kind, shown: n }): Tally => ({ ...at, kind, shown: n }));
        const progress = readProgress(plan.steps, [], tallies);
        const onHand = new Map(progress.items.map((item) => [item.item, item.onHand]));
        for (const item of progress.items) {
          expect(item.onHand).toBeCloseTo(item.made - item.lost - item.used, 9);
        }
        for (const step of progress.steps) {
          expect(step.good).toBe(Math.max(0, step.made - step.lost));
          expect(step.ready).toBeGreaterThanOrEqual(0);
          expect(step.ready).toBeLessThanOrEqual(step.toGo);
          for (const { lane, possible } of step.lanes) {
            for (const [item, each] of Object.entries(lane.consumes)) {
              const [n = 0, d = 1] = String(each).split('/').map(Number);
              const there = Math.max(0, onHand.get(item) ?? 0);
              expect(((possible ?? 0) * n) / d).toBeLessThanOrEqual(there + 1e-9);
            }
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it('leave nothing to do and nothing outrun when every lane is full', () => {
    const { steps } = readProgress(plan.steps, [], allDone());
    for (const { toGo, outrun, ready } of steps) {
      expect({ toGo, outrun, ready }).toEqual({ toGo: 0, outrun: 0, ready: 0 });
    }
  });

  it('of steps that are not in the plan count for nothing', () => {
    const stray: Tally = { step: 'elsewhere', lane: 'A', kind: 'done', shown: 9 };
    expect(readProgress(plan.steps, [], [stray])).toEqual(readProgress(plan.steps, [], []));
  });
});
