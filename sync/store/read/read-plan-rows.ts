import {
  PlanLaneSchema,
  PlanStepSchema,
  type PlanLane,
  type PlanStep,
} from '../../../shared/model/plan';
import type { ExtraLane } from '../../../shared/model/tally';
import type { SqlDatabase } from '../sql-database';

interface PlanRows {
  steps: PlanStep[];
  extraLanes: ExtraLane[];
}
interface StepRow {
  scope_id: string;
  key: string;
  body: string;
}
interface LaneRow {
  scope_id: string;
  step: string;
  extra: number;
  body: string;
}

const BodySchema = PlanStepSchema.omit({ lanes: true });

/** The frozen steps and lanes of every project, and the lanes opened later. */
export async function readPlanRows(db: SqlDatabase): Promise<Map<string, PlanRows>> {
  const plans = new Map<string, PlanRows>();
  const planOf = (scope: string) => {
    const plan = plans.get(scope) ?? { steps: [], extraLanes: [] };
    plans.set(scope, plan);
    return plan;
  };
  const lanes = new Map<string, PlanLane[]>();
  const [laneRows, stepRows] = await Promise.all([
    db.all<LaneRow>('SELECT scope_id, step, extra, body FROM lane ORDER BY extra, position'),
    db.all<StepRow>('SELECT scope_id, key, body FROM step ORDER BY position'),
  ]);
  for (const row of laneRows) {
    const lane = PlanLaneSchema.parse(JSON.parse(row.body));
    const name = `${row.scope_id}\t${row.step}`;
    if (row.extra === 1) planOf(row.scope_id).extraLanes.push({ ...lane, step: row.step });
    else lanes.set(name, [...(lanes.get(name) ?? []), lane]);
  }
  for (const row of stepRows) {
    const body = BodySchema.parse(JSON.parse(row.body));
    const own = lanes.get(`${row.scope_id}\t${row.key}`) ?? [];
    planOf(row.scope_id).steps.push({ ...body, lanes: own });
  }
  return plans;
}
