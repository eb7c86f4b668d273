import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';

/** Puts the diagram of one kind of step into a sentence or two; `done` in taps of the lane. */
export type Describe = (plan: Plan, lane: PlanLane | null, done: number, step: PlanStep) => string;
