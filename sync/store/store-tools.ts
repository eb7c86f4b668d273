import type { Plan, PlanRefusal } from '../../shared/model/plan';
import type { PlanRequest } from '../../shared/model/plan-request';
import type { TallyKey } from '../../shared/model/tally';
import type { Result } from '../../shared/result';

/** A project of the example, with the counts it is shown at. */
export interface ExampleProject {
  name: string;
  note?: string;
  request: PlanRequest;
  counts: readonly (TallyKey & { want: number })[];
}

/** What a store takes from outside: the clock, randomness, and the engine that plans. */
export interface StoreTools {
  nowMs(): number;
  /** 16 random bytes */
  random16(): Promise<Uint8Array>;
  makePlan(
    request: PlanRequest,
  ): Result<Plan, { kind: 'refused'; errors: readonly Pick<PlanRefusal, 'code'>[] }>;
  exampleProjects(): readonly ExampleProject[];
  /** new project ids, UUIDv7 */
  newIds(count: number): Promise<string[]>;
}
