import type { FractionText } from '../../model/length';
import type { Plan, PlanLane } from '../../model/plan';

import { laneLetters } from './lane-letters';
import { batchAt } from './strip-layout';
import { toInches } from './to-inches';

export interface LengthBatch {
  letter: string;
  length: FractionText;
  lengthIn: number;
  /** lengths from the strip at hand, and how many of them are cut */
  count: number;
  done: number;
}

/** The strip that a lane's next length is cut from; a lane takes 1/k of a strip a tap. */
export function lengthBatch(plan: Plan, lane: PlanLane | null, done: number): LengthBatch {
  const letter = laneLetters(lane)[0] ?? plan.stacks[0]?.layers[0] ?? '';
  const fabric = plan.fabrics.find((row) => row.letter === letter);
  const strip = fabric?.strips.find((row) => row.for === 'wedge');
  const [share] = Object.values(lane?.consumes ?? {});
  const each = share === undefined ? 1 : Math.round(1 / toInches(String(share)));
  const length = strip?.length ?? plan.request.cloth.usableWidth;
  return {
    letter,
    length,
    lengthIn: toInches(length),
    ...batchAt(done, lane?.target ?? each, each),
  };
}
