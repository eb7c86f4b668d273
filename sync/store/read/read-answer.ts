import type { Answer } from '../command';
import type { SqlDatabase } from '../sql-database';
import { sql } from '../sql-text';

const KEPT_MS = 10 * 60 * 1000;

/** The answer a request was given, by this opening of the file or an earlier one. */
export async function readAnswer(db: SqlDatabase, request: string): Promise<Answer | null> {
  const [row] = await db.all<{ answer: string }>('SELECT answer FROM request WHERE id = ?', [
    request,
  ]);
  return row ? (JSON.parse(row.answer) as Answer) : null;
}

/**
 * Statements that keep an answer with its act. The id is unique: what was done before fails here.
 * A tab sends a request again within seconds of a change of leader; what is older than ten minutes
 * is forgotten.
 */
export const keepAnswer = (request: string, answer: Answer, nowMs: number): string[] => [
  sql`INSERT INTO request (id, answer, at_ms)
    VALUES (${request}, ${JSON.stringify(answer)}, ${nowMs})`,
  sql`DELETE FROM request WHERE at_ms < ${nowMs - KEPT_MS}`,
];
