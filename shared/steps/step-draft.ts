import type { Station, StepRole } from '../model/codes';
import type { Message, PlanLane, PlanStep } from '../model/plan';

/** A step before it knows its place in the order of work. */
export interface StepDraft {
  role: StepRole;
  /** piece and its cut geometry, as in "wedge 16 2 11/2 1/4" */
  piece: string;
  fabricRole: 'wedge' | 'circle' | 'background' | 'block';
  params: Message['params'];
  lanes: PlanLane[];
  station?: Station;
  settings?: PlanStep['settings'];
}

/** A lane whose one tap makes one thing. */
export function lane(
  key: string,
  target: number,
  consumes: PlanLane['consumes'],
  made: string,
): PlanLane {
  return { key, target, consumes, makes: { [made]: 1 } };
}

export const NEEDLE = '80/12';
export const PIECING_MM = '21/10';
