import { InvariantError } from '../../shared/result';
import type { SqlValue } from './sql-database';

/**
 * Values written into SQL as literals. A transaction then crosses to the database's worker as one
 * message instead of three a statement, which is most of a tap's time.
 *
 * @example sql`DELETE FROM note WHERE id = ${"it's"}` // DELETE FROM note WHERE id = 'it''s'
 */
export function sql(parts: TemplateStringsArray, ...values: readonly SqlValue[]): string {
  return parts.reduce((text, part, index) => {
    const value = values[index - 1];
    return text + (value === undefined ? '' : writeLiteral(value)) + part;
  });
}

/** A value as an SQLite literal. @throws InvariantError for numbers that SQL has no literal for */
export function writeLiteral(value: SqlValue): string {
  if (value === null) return 'NULL';
  if (value instanceof Uint8Array) {
    return `X'${[...value].map((byte) => byte.toString(16).padStart(2, '0')).join('')}'`;
  }
  if (typeof value === 'string') return writeText(value);
  if (!Number.isFinite(value)) throw new InvariantError(`no SQL literal for ${value}`);
  return String(value);
}

/**
 * A text as it can be stored: SQL text ends at a NUL, and half a surrogate pair has no UTF-8; neither
 * may cut a statement short. What people type goes through this first, so that what is shown now is
 * what is read later.
 */
export const storableText = (text: string) =>
  text.replaceAll('\u0000', '\uFFFD').replace(/\p{Surrogate}/gu, '\uFFFD');

const writeText = (text: string) => `'${storableText(text).replaceAll("'", "''")}'`;
