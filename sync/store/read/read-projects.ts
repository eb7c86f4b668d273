import { PlanRequestSchema } from '../../../shared/model/plan-request';
import type { ProjectRecord } from '../project-record';
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

/** Every project of this file, those in the bin too. Asked at once: the worker is a message away. */
export async function readProjects(db: SqlDatabase): Promise<ProjectRecord[]> {
  const [rows, fields, plans, counts] = await Promise.all([
    db.all<ProjectRow>('SELECT * FROM project'),
    readFields(db),
    readPlanRows(db),
    readTallies(db),
  ]);
  return rows.flatMap((row) => {
    const field = fields.get(row.scope_id);
    if (!field) return [];
    const { steps, extraLanes } = plans.get(row.scope_id) ?? { steps: [], extraLanes: [] };
    const count = counts.get(row.scope_id);
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
          undoable: count?.undoable ?? [],
        },
        deleted: row.deleted === 1,
        edits: row.edits,
        fieldBase: field.bases,
        tallies: count?.tallies ?? new Map(),
      },
    ];
  });
}
