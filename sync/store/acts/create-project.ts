import type { Plan, PlanStep } from '../../../shared/model/plan';
import type { ProjectRecord } from '../project-record';
import { hashIdentity } from '../../merge/identity-hash';
import { FIELDS } from '../../merge/operation';
import { sql } from '../sql-text';
import { writeAct, type Work, type WrittenAct } from '../work';

export interface ProjectStart {
  id: string;
  name: string;
  note: string;
  example: boolean;
  plan: Plan;
}

/** Writes a new project with the frozen rows of its plan. */
export function createProject(work: Work, start: ProjectStart): void {
  const { id, name, note, example } = start;
  const { request, engine, steps } = start.plan;
  const act = { kind: 'project', name, note, example, request, engine, steps } as const;
  const written = writeAct(work, id, act);
  const edits = hashIdentity(written);
  work.statements.push(
    sql`INSERT INTO sync_scope (id, kind) VALUES (${id}, 'project')`,
    sql`INSERT INTO project (scope_id, session, seq, example, created_ms, engine, request, edits)
      VALUES (${id}, ${written.session}, ${written.seq}, ${example ? 1 : 0}, ${written.stampMs},
        ${engine}, ${JSON.stringify(request)}, ${edits})`,
    ...FIELDS.map((field) => insertField(id, written, field, start[field])),
    ...steps.flatMap((step) => insertStep(id, step)),
  );
  const record = toRecord(start, written, edits);
  work.records.set(id, record);
  work.changes.push({ kind: 'project', project: record.view });
}

const insertField = (id: string, { session, seq, stampMs }: WrittenAct, field: string, v: string) =>
  sql`INSERT INTO field_write (scope_id, session, seq, field, value, stamp_ms)
    VALUES (${id}, ${session}, ${seq}, ${field}, ${v}, ${stampMs})`;

function insertStep(id: string, { lanes, ...body }: PlanStep): string[] {
  const { key, position } = body;
  return [
    sql`INSERT INTO step (scope_id, key, position, body)
      VALUES (${id}, ${key}, ${position}, ${JSON.stringify(body)})`,
    ...lanes.map(
      (lane, index) => sql`INSERT INTO lane (scope_id, step, key, position, extra, body)
        VALUES (${id}, ${key}, ${lane.key}, ${index}, 0, ${JSON.stringify(lane)})`,
    ),
  ];
}

function toRecord(start: ProjectStart, written: WrittenAct, edits: string): ProjectRecord {
  const { id, name, note, example, plan } = start;
  return {
    view: {
      id,
      name,
      note,
      example,
      createdAtMs: written.stampMs,
      workedAtMs: null,
      lastStepKey: null,
      request: plan.request,
      engine: plan.engine,
      steps: plan.steps,
      extraLanes: [],
      tallies: [],
      undoable: [],
    },
    deleted: false,
    edits,
    fieldBase: { name: written, note: written },
    tallies: new Map(),
  };
}
