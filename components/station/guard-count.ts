/** More than this many stacks in one entry asks first. */
const STACKS_AT_ONCE = 3;

export interface CountBefore {
  /** pieces or units that stand now, in the lane and in the whole step */
  laneGood: number;
  stepGood: number;
  /** what the plan wants of them */
  laneTarget: number;
  stepTarget: number;
  /** pieces of one full stack, null where no stacks are cut */
  stackPieces: number | null;
}

export type CountQuestion =
  | { kind: 'not-yet'; reason: string }
  | { kind: 'over-step'; would: number; target: number }
  | { kind: 'over-lane'; would: number; target: number }
  | { kind: 'jump'; pieces: number; stacks: number };

/**
 * Says what to ask before a count is kept: over the target, or more than three stacks at once.
 *
 * @param adds pieces or units that the entry adds; taking away never asks
 * @returns the question, or null when the count may stand without one
 */
export function guardCount(before: CountBefore, adds: number): CountQuestion | null {
  if (adds <= 0) return null;
  const wouldStep = before.stepGood + adds;
  if (wouldStep > before.stepTarget) {
    return { kind: 'over-step', would: wouldStep, target: before.stepTarget };
  }
  const wouldLane = before.laneGood + adds;
  if (wouldLane > before.laneTarget) {
    return { kind: 'over-lane', would: wouldLane, target: before.laneTarget };
  }
  if (before.stackPieces !== null && adds > STACKS_AT_ONCE * before.stackPieces) {
    return { kind: 'jump', pieces: adds, stacks: Math.ceil(adds / before.stackPieces) };
  }
  return null;
}
