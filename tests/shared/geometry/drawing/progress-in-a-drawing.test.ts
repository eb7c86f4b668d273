import { cutRun, stackRun } from '../../../../shared/geometry/drawing/cut-run';
import { findUnit } from '../../../../shared/geometry/drawing/find-unit';
import { lengthBatch } from '../../../../shared/geometry/drawing/length-batch';
import { batchAt, layOutCuts } from '../../../../shared/geometry/drawing/strip-layout';
import { stackRows } from '../../../../shared/geometry/drawing/stack-rows';
import { fabricsFor, ringPlan } from '../../../support/ring-plan';

const laneOf = (plan: ReturnType<typeof ringPlan>, role: string) =>
  plan.steps.find((step) => step.role === role)?.lanes[0] ?? null;

describe('batchAt', () => {
  it('counts within the strip at hand', () => {
    expect(batchAt(5, 10, 4)).toEqual({ start: 4, done: 1, count: 4 });
    expect(batchAt(8, 10, 4)).toEqual({ start: 8, done: 0, count: 2 });
  });

  it('shows the last strip, all done, when the lane is full', () => {
    expect(batchAt(10, 10, 4)).toEqual({ start: 8, done: 2, count: 2 });
    expect(batchAt(8, 8, 4)).toEqual({ start: 4, done: 4, count: 4 });
  });
});

describe('cutRun', () => {
  it('counts cuts within the current stack of 4', () => {
    const plan = ringPlan({ blocks: 3 });
    const lane = laneOf(plan, 'cut');
    const each = plan.stacks[0]?.cutsEach ?? 0;
    const run = cutRun(plan, lane, each + 2);
    expect(run.done).toBe(2);
    expect(run.layers).toEqual(['A', 'B', 'C', 'D']);
    expect(run.pieces.length).toBe(each);
  });

  it('shows one layer in a lane that recuts one fabric', () => {
    const plan = ringPlan();
    const lane = { key: 'D1', target: 1, consumes: {}, makes: { 'wedge:D': 1 } };
    const run = cutRun(plan, lane, 0);
    expect(run.layers).toEqual(['D']);
    expect(run.pieces.length).toBe(1);
  });

  it('lies on a length as cut, half the squaring in from its end', () => {
    const run = cutRun(ringPlan(), laneOf(ringPlan(), 'cut'), 0);
    expect([run.lengthIn, run.heightIn]).toEqual([12, 5.5]);
    const xs = run.pieces.flatMap(({ outline }) => outline.map(([x]) => x));
    expect(Math.min(...xs)).toBeCloseTo(0.25, 9);
  });

  it('keeps the whole run on the cloth', () => {
    const run = stackRun(ringPlan(), null);
    const xs = run.pieces.flatMap(({ outline }) => outline.map(([x]) => x));
    expect(Math.min(...xs)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...xs)).toBeLessThanOrEqual(run.lengthIn);
  });
});

describe('lengthBatch', () => {
  it('reads from the lane how many lengths a strip gives', () => {
    const plan = ringPlan();
    const lane = { key: 'A', target: 5, consumes: { 'strip:A': '1/3' }, makes: { 'length:A': 1 } };
    expect(lengthBatch(plan, lane, 4)).toMatchObject({
      letter: 'A',
      length: '12',
      count: 2,
      done: 1,
    });
  });
});

describe('findUnit', () => {
  it('finds the pair that a lane makes, and the halves of a ring', () => {
    const plan = ringPlan();
    const lane = { key: 'C+D', target: 4, consumes: {}, makes: { 'pair:C+D': 1 } };
    expect(findUnit(plan, 'pair', lane)?.letters).toEqual(['C', 'D']);
    expect(findUnit(plan, 'ring', null)?.parts.map((part) => part.letters.length)).toEqual([8, 8]);
  });

  it('has no quarter in a ring of 18 wedges', () => {
    expect(findUnit(ringPlan({ wedges: 18, fabrics: fabricsFor(3) }), 'quarter', null)).toBeNull();
  });
});

describe('layOutCuts', () => {
  const cuts = {
    clothIn: 42,
    partIn: 12,
    heightPx: 40,
    startIn: 0,
    count: 3,
    done: 1,
    scale: 5,
    room: { x: 10, y: 20, width: 210, height: 40 },
  };

  it('puts the next cut at the far end of the next part', () => {
    const next = layOutCuts({ ...cuts, leftHanded: false }).parts[1];
    expect(next?.state).toBe('next');
    expect(next?.cut[0]).toEqual([10 + 24 * 5, 60]);
  });

  it('mirrors the order for a left hand', () => {
    const { parts, clip } = layOutCuts({ ...cuts, leftHanded: true });
    expect(parts[0]?.box.x).toBeCloseTo(clip.x + clip.width - 60, 9);
    expect(parts[1]?.cut[0][0]).toBeCloseTo(clip.x + clip.width - 120, 9);
  });
});

describe('stackRows', () => {
  it('opens it for one layer too many', () => {
    const rows = stackRows(7, { x: 0, y: 0, width: 72, height: 120 });
    expect(Math.min(...rows.map(({ height }) => height))).toBeGreaterThanOrEqual(17);
  });

  it('opens another column rather than make letters too small', () => {
    const rows = stackRows(12, { x: 0, y: 0, width: 72, height: 120 });
    expect(new Set(rows.map(({ x }) => x)).size).toBe(2);
    expect(Math.min(...rows.map(({ height }) => height))).toBeGreaterThanOrEqual(17);
    expect(Math.max(...rows.map(({ y, height }) => y + height))).toBeLessThanOrEqual(120);
  });
});
