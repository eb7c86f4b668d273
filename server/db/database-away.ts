import { isNativeError } from 'node:util/types';

// Classes and codes of https://www.postgresql.org/docs/15/errcodes-appendix.html: 08 connection,
// 57P01–57P03 shutting down or starting, 53300 too many connections; the rest are Node's.
const AWAY =
  /^(08...|57P0[123]|53300|ECONNREFUSED|ECONNRESET|EPIPE|ETIMEDOUT|ENOTFOUND|EAI_AGAIN|EHOSTUNREACH)$/;
// errors without a code: pg's own, and TypeORM's for a data source that has not connected yet
const WORDS =
  /^(Connection terminated|timeout exceeded when trying to connect|Driver not Connected$)/;

/** Whether an error means that PostgreSQL cannot be reached, and not that a query is wrong. */
export function isDatabaseAway(error: unknown): boolean {
  if (!isNativeError(error)) return false;
  // a name with two addresses, both refused
  if ('errors' in error && Array.isArray(error.errors)) return error.errors.some(isDatabaseAway);
  if ('code' in error && typeof error.code === 'string') return AWAY.test(error.code);
  return WORDS.test(error.message);
}
