import type { Plan, PlanLane } from '../../model/plan';

import { toInches } from './to-inches';
import { tumblingPieces, type TumblingPiece } from './tumbling';

/** The stack under the blade, and how far it is cut. Lengths in inches. */
export interface CutRun {
  /** from the top */
  layers: string[];
  lengthIn: number;
  heightIn: number;
  pieces: TumblingPiece[];
  /** cuts done in this stack */
  done: number;
}

const lettersOf = (lane: PlanLane): string[] =>
  Object.keys(lane.makes).map((item) => item.slice(item.indexOf(':') + 1));

/**
 * The stack that a lane's next cut is in. A full lane shows its last stack, all of it cut.
 *
 * @param lane null: the plan's first stack
 * @param done taps of that lane, each one cut through all layers
 */
export function cutRun(plan: Plan, lane: PlanLane | null, done: number): CutRun {
  const made = lane ? lettersOf(lane) : [];
  const stack =
    plan.stacks.find(({ layers }) => made.length > 0 && made.every((l) => layers.includes(l))) ??
    plan.stacks[0];
  const layers = stack?.layers.filter((l) => made.length === 0 || made.includes(l)) ?? [];
  const each = Math.max(1, stack?.cutsEach ?? 1);
  const full = lane !== null && done >= lane.target && lane.target > 0;
  const startsAt = full ? Math.floor((lane.target - 1) / each) * each : done - (done % each);
  const count = lane ? Math.max(1, Math.min(each, lane.target - startsAt)) : each;
  return {
    layers,
    ...runOf(plan, layers, count),
    done: full ? count : done % each,
  };
}

function runOf(plan: Plan, layers: readonly string[], count: number) {
  const { wedge } = plan.geometry;
  const strips = plan.fabrics.find(({ letter }) => letter === layers[0])?.strips ?? [];
  const strip = strips.find((row) => row.for === 'wedge');
  const oneWay = plan.request.fabrics.some((f) => f.oneWay && layers.includes(f.letter));
  const heightIn = toInches(wedge.stripHeight);
  const pieces = tumblingPieces({
    narrowIn: toInches(wedge.cutNarrow),
    wideIn: toInches(wedge.cutWide),
    heightIn,
    count,
    startIn: toInches(plan.request.cutting.squaringOff) / 2,
    oneWay,
  });
  const endIn = Math.max(0, ...pieces.flatMap((p) => p.outline.map(([x]) => x)));
  const lengthIn = Math.max(strip ? toInches(strip.length) : 0, endIn);
  return { lengthIn, heightIn, pieces };
}
