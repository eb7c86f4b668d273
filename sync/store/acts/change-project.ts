import type { ExtraLane } from '../../../shared/model/tally';
import { hashIdentity, xorHashes } from '../../merge/identity-hash';
import type { FieldName } from '../../merge/operation';
import type { ProjectRecord } from '../project-record';
import { sql } from '../sql-text';
import { writeAct, type Work, type WrittenAct } from '../work';

/** Writes a field on top of the value seen. */
export function writeField(work: Work, record: ProjectRecord, field: FieldName, value: string) {
  const { id } = record.view;
  const { session, seq } = record.fieldBase[field];
  const base = { session, seq };
  const written = writeAct(work, id, { kind: 'field', field, value, base });
  work.statements.push(
    sql`INSERT INTO field_write
      (scope_id, session, seq, field, value, stamp_ms, base_session, base_seq)
      VALUES (${id}, ${written.session}, ${written.seq}, ${field}, ${value}, ${written.stampMs},
        ${base.session}, ${base.seq})`,
  );
  const fieldBase = { ...record.fieldBase, [field]: written };
  const view = { ...record.view, [field]: value };
  keepEdited(work, { ...record, view, fieldBase }, written);
}

/** Puts the project into the bin, naming every edit of it that this device has seen. */
export function deleteProject(work: Work, record: ProjectRecord): void {
  const { id } = record.view;
  const { edits } = record;
  const { session, seq, stampMs } = writeAct(work, id, { kind: 'delete', seen: edits });
  work.statements.push(
    sql`INSERT INTO bin (scope_id, session, seq, stamp_ms, seen)
      VALUES (${id}, ${session}, ${seq}, ${stampMs}, ${edits})`,
    sql`UPDATE project SET deleted = 1 WHERE scope_id = ${id}`,
  );
  work.records.set(id, { ...record, deleted: true });
  work.changes.push({ kind: 'gone', id });
}

/** Brings a binned project back whole: an edit, which no delete before it has seen. */
export function restoreProject(work: Work, record: ProjectRecord): void {
  keepEdited(work, record, writeAct(work, record.view.id, { kind: 'restore' }));
}

/** Opens a lane that the plan has not, for recutting. */
export function addExtraLane(work: Work, record: ProjectRecord, extra: ExtraLane): void {
  const { id, extraLanes } = record.view;
  const { step, ...lane } = extra;
  writeAct(work, id, { kind: 'lane', step, lane });
  work.statements.push(
    sql`INSERT INTO lane (scope_id, step, key, position, extra, body)
      VALUES (${id}, ${step}, ${lane.key}, ${extraLanes.length}, 1, ${JSON.stringify(lane)})`,
  );
  keep(work, { ...record, view: { ...record.view, extraLanes: [...extraLanes, extra] } });
}

function keepEdited(work: Work, record: ProjectRecord, written: WrittenAct): void {
  const edits = xorHashes(record.edits, hashIdentity(written));
  const { id } = record.view;
  work.statements.push(
    sql`UPDATE project SET edits = ${edits}, deleted = 0 WHERE scope_id = ${id}`,
  );
  keep(work, { ...record, edits, deleted: false });
}

function keep(work: Work, record: ProjectRecord): void {
  work.records.set(record.view.id, record);
  if (!record.deleted) work.changes.push({ kind: 'project', project: record.view });
}
