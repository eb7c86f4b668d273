import type { Plan, PlanLane } from '../../model/plan';

import { laneLetters } from './lane-letters';
import { batchAt } from './strip-layout';
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

/**
 * The stack that a lane's next cut is in. A full lane shows its last stack, all of it cut.
 *
 * @param lane null: the plan's first stack
 * @param done taps of that lane, each one cut through all layers
 */
export function cutRun(plan: Plan, lane: PlanLane | null, done: number): CutRun {
  const { layers, each } = stackOf(plan, lane);
  const batch = lane ? batchAt(done, lane.target, each) : { done: 0, count: each };
  return { layers, ...runOf(plan, layers, batch.count), done: batch.done };
}

/** The stack that a lane builds, not cut yet. */
export function stackRun(plan: Plan, lane: PlanLane | null): CutRun {
  const { layers, each } = stackOf(plan, lane);
  return { layers, ...runOf(plan, layers, each), done: 0 };
}

/** A lane opened to recut one fabric has that layer alone. */
function stackOf(plan: Plan, lane: PlanLane | null): { layers: string[]; each: number } {
  const named = laneLetters(lane);
  const holds = (layers: readonly string[]) => named.every((letter) => layers.includes(letter));
  const stack = plan.stacks.find(({ layers }) => holds(layers)) ?? plan.stacks[0];
  const layers = stack?.layers ?? [];
  const own = named.length > 0 ? layers.filter((letter) => named.includes(letter)) : layers;
  return { layers: own, each: Math.max(1, stack?.cutsEach ?? 1) };
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
