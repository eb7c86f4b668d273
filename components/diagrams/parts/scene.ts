import type { Paints } from '@/components/diagrams/parts/paints';
import type { Box } from '@/shared/geometry/drawing/points';
import type { RingShape } from '@/shared/geometry/drawing/ring-shape';
import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';

/** What the drawing of a step is made from; `box` is its place in pixels. */
export interface Scene {
  plan: Plan;
  shape: RingShape;
  step: PlanStep;
  lane: PlanLane | null;
  done: number;
  box: Box;
  leftHanded: boolean;
  paints: Paints;
}
