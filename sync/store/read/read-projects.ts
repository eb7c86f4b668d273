import { PlanRequestSchema } from '../../../shared/model/plan-request';
import { toUndoable, type ProjectRecord } from '../project-record';
import type { SqlDatabase } from '../sql-database';
import { readFields } from './read-fields';
import { readPlanRows } from './read-plan-rows';
import { readTallies } from './read-tallies';

interface ProjectRow {
  scope_id: string;
  example: number;
  created_ms: number;
  engine: string;
  request: string;
  edits: string;
  deleted: number;
}

/** Every project of this file, those in the bin too. */
export async function readProjects(db: SqlDatabase): Promise<ProjectRecord[]> {
  const rows = await db.all<ProjectRow>('SELECT * FROM project');
  const fields = await readFields(db);
  const plans = await readPlanRows(db);
  const counts = await readTallies(db);
  return rows.flatMap((row) => {
    const field = fields.get(row.scope_id);
    if (!field) return [];
    const { steps, extraLanes } = plans.get(row.scope_id) ?? { steps: [], extraLanes: [] };
    const count = counts.get(row.scope_id);
    const newest = count?.newest ?? new Map();
    return [
      {
        view: {
          id: row.scope_id,
          name: field.values.name,
          note: field.values.note,
          example: row.example === 1,
          createdAtMs: row.created_ms,
          workedAtMs: count?.workedAtMs ?? null,
          lastStepKey: count?.lastStepKey ?? null,
          request: PlanRequestSchema.parse(JSON.parse(row.request)),
          engine: row.engine,
          steps,
          extraLanes,
          tallies: count?.shown ?? [],
          undoable: [...newest.values()].map(toUndoable),
        },
        deleted: row.deleted === 1,
        edits: row.edits,
        fieldBase: field.bases,
        tallies: count?.tallies ?? new Map(),
        newest,
      },
    ];
  });
}
