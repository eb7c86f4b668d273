import type { WedgeLengths } from '../cutting/wedge-lengths';
import type { PlanStack } from '../model/plan';
import { layerOrder } from './layer-order';
import type { StackGroup } from './stack-groups';

/**
 * The stacks of one group: as many as there are lengths of each fabric. A last one that takes fewer
 * cuts stands in a row of its own. Stacks × cuts × layers = pieces.
 */
export function planStacks(group: StackGroup, cut: WedgeLengths): PlanStack[] {
  const layers = layerOrder(group.fabrics);
  const stacksOf = (count: number, cutsEach: number): PlanStack => ({
    layers,
    count,
    cutsEach,
    perCut: layers.length,
    pieces: count * cutsEach * layers.length,
  });
  if (cut.lastEach === cut.each) return [stacksOf(cut.lengths, cut.each)];
  return [stacksOf(cut.lengths - 1, cut.each), stacksOf(1, cut.lastEach)].filter(
    ({ count }) => count > 0,
  );
}
