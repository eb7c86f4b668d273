import { findReplacement } from '../../../shared/cutting/find-replacement';
import type { StepRole } from '../../../shared/model/codes';
import type { Progress, Tally } from '../../../shared/model/tally';
import { readProgress } from '../../../shared/steps/read-progress';
import { recutLane } from '../../../shared/steps/recut-lane';
import { fivePlates } from '../support/plans';

const plan = fivePlates();

function stepOf(role: StepRole) {
  const step = plan.steps.find((other) => other.role === role);
  if (!step) throw new Error(`no step ${role}`);
  return step;
}

/** Every lane of these steps full. */
function full(...roles: StepRole[]): Tally[] {
  return roles.flatMap((role) =>
    stepOf(role).lanes.map(({ key, target }) => tally(role, key, 'done', target)),
  );
}

function tally(role: StepRole, lane: string, kind: Tally['kind'], shown: number): Tally {
  return { step: stepOf(role).key, lane, kind, shown };
}

function progressAt(role: StepRole, progress: Progress) {
  const found = progress.steps.find((step) => step.role === role);
  if (!found) throw new Error(`no progress of ${role}`);
  return found;
}

const CUT = 'A1+B1+C1+D1+E1';
const lostD = tally('cut', 'wedge:D', 'lost', 1);

describe('five 12-inch plates of 20 wedges from five fabrics', () => {
  it('cuts 4-inch strips, 25 wedges a strip, one strip of each fabric, five lengths of 8', () => {
    expect(plan.geometry.wedge).toMatchObject({ stripHeight: '4', perStrip: 25 });
    for (const { letter, strips } of plan.fabrics.slice(0, 5)) {
      expect({ letter, wedge: strips[0] }).toEqual({
        letter,
        wedge: { height: '4', count: 1, for: 'wedge', lengths: 5, length: '8', each: 4 },
      });
    }
  });

  it('makes five stacks of five layers, four cuts each', () => {
    expect(plan.stacks).toEqual([
      { layers: ['A', 'B', 'C', 'D', 'E'], count: 5, cutsEach: 4, perCut: 5, pieces: 100 },
    ]);
    expect(stepOf('cut')).toMatchObject({ target: 100, lanes: [{ key: CUT, target: 20 }] });
  });

  it('takes eight strips and a yard and a half', () => {
    expect(plan.totals).toEqual({ strips: 8, buyYards: '3/2', wedges: 100 });
  });

  it('warns that B and the background have no slack', () => {
    expect(
      plan.warnings.filter(({ code }) => code === 'noSlack').map(({ params }) => params),
    ).toEqual([
      { fabric: 'B', needs: '9', buyYards: '1/4', offerYards: '3/8' },
      { fabric: 'F', needs: '27', buyYards: '3/4', offerYards: '7/8' },
    ]);
  });

  it('cuts five circles of 4⅝ from 5-inch squares', () => {
    expect(plan.geometry.circle).toMatchObject({ cutDiameter: { cut: '37/8' }, square: '5' });
    expect(plan.fabrics[1]?.strips[1]).toEqual({
      height: '5',
      count: 1,
      for: 'circle',
      lengths: 5,
      length: '5',
      each: 1,
    });
  });

  it('sews quarters of a pair A+C, a single B on the diagonal, and a pair D+E', () => {
    expect(plan.geometry.ring.order).toEqual(['A', 'C', 'B', 'D', 'E']);
    expect(stepOf('pair').lanes.map(({ key, target }) => [key, target])).toEqual([
      ['A+C', 20],
      ['D+E', 20],
    ]);
    expect(stepOf('quarter').lanes).toEqual([
      {
        key: 'A+C+B+D+E',
        target: 20,
        consumes: { 'pair:A+C': 1, 'tip:B': 1, 'pair:D+E': 1 },
        makes: { 'quarter:A+C+B+D+E': 1 },
      },
    ]);
  });
});

describe('the counts of those plates', () => {
  const stacked = full('strip', 'length', 'stack');

  it('counts 105 after the 21st cut, 5 more than the stacks give, and 100 after its undo', () => {
    const over = readProgress(plan.steps, [], [...stacked, tally('cut', CUT, 'done', 21)]);
    expect(progressAt('cut', over)).toMatchObject({ made: 105, toGo: 0, outrun: 5 });
    const undone = readProgress(plan.steps, [], [...stacked, tally('cut', CUT, 'done', 20)]);
    expect(progressAt('cut', undone)).toMatchObject({ made: 100, good: 100, toGo: 0, outrun: 0 });
  });

  it('has 99 good and 1 to recut after one miscut in D', () => {
    const progress = readProgress(
      plan.steps,
      [],
      [...stacked, tally('cut', CUT, 'done', 20), lostD],
    );
    expect(progressAt('cut', progress)).toMatchObject({
      target: 101,
      made: 100,
      lost: 1,
      good: 99,
      toGo: 1,
      ready: 1,
    });
  });

  it('finds no offcut wide enough for D: 2 in left, 2¼ needed, so ⅛ yd is bought', () => {
    expect(findReplacement(plan, 'D', 1)).toEqual({
      from: 'buy',
      letter: 'D',
      yards: '1/8',
      widestLeft: '2',
      needed: '9/4',
    });
  });

  it('finds 17 × 5 in left of the circle strip for B', () => {
    expect(findReplacement(plan, 'B', 1)).toEqual({
      from: 'offcut',
      letter: 'B',
      height: '5',
      left: '17',
      needed: '9/4',
    });
  });

  it('has enough for 20 pairs A+C and 19 D+E once every tip that is left is turned', () => {
    const tips = full('tip-sew', 'tip-trim', 'tip-turn').map((count) =>
      count.lane === 'D' ? { ...count, shown: 19 } : count,
    );
    const counts = [...stacked, tally('cut', CUT, 'done', 20), lostD, ...tips];
    const progress = readProgress(plan.steps, [], counts);
    const pair = progressAt('pair', progress);
    expect(pair.lanes.map(({ lane, possible }) => [lane.key, possible])).toEqual([
      ['A+C', 20],
      ['D+E', 19],
    ]);
    expect(pair).toMatchObject({ ready: 39, toGo: 40 });
  });

  it('is whole again once the lost wedge is recut in a lane of its own', () => {
    const lane = recutLane(plan, 'D', 1);
    expect(lane).toEqual({
      step: stepOf('cut').key,
      key: 'D1',
      target: 1,
      consumes: {},
      makes: { 'wedge:D': 1 },
    });
    const counts = [
      ...stacked,
      tally('cut', CUT, 'done', 20),
      lostD,
      tally('cut', 'D1', 'done', 1),
    ];
    const progress = readProgress(plan.steps, [lane], counts);
    expect(progressAt('cut', progress)).toMatchObject({ made: 101, good: 100, toGo: 0 });
    expect(progressAt('tip-sew', progress).lanes.map(({ possible }) => possible)).toEqual([
      20, 20, 20, 20, 20,
    ]);
  });
});
