import type { Answer } from '../command';
import type { SqlDatabase } from '../sql-database';
import { sql } from '../sql-text';

const KEPT_MS = 10 * 60 * 1000;

/**
 * Answers already given, by request. A tab sends a request again within seconds of a change of
 * leader; what is older than ten minutes is forgotten.
 */
export async function readAnswers(db: SqlDatabase, nowMs: number): Promise<Map<string, Answer>> {
  await db.exec(sql`DELETE FROM request WHERE at_ms < ${nowMs - KEPT_MS}`);
  const rows = await db.all<{ id: string; answer: string }>('SELECT id, answer FROM request');
  return new Map(rows.map(({ id, answer }) => [id, JSON.parse(answer) as Answer]));
}
