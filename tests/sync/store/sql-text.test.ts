import * as fc from 'fast-check';

import { InvariantError } from '../../../shared/result';
import { sql, writeLiteral } from '../../../sync/store/sql-text';
import { openNodeDatabase } from '../../support/open-node-database';

it('writes literals that SQLite reads back as they were', async () => {
  const db = openNodeDatabase(':memory:');
  const value = fc.oneof(
    fc.string({ unit: 'grapheme' }).filter((text) => !text.includes('\u0000')),
    fc.maxSafeInteger(),
    fc.double({ noNaN: true, noDefaultInfinity: true }).filter((n) => !Object.is(n, -0)),
    fc.uint8Array({ maxLength: 9, minLength: 1 }),
    fc.constant(null),
  );
  await fc.assert(
    fc.asyncProperty(value, async (given) => {
      const [row] = await db.all<{ v: unknown }>(`SELECT ${writeLiteral(given)} AS v`);
      expect(row?.v).toEqual(given);
    }),
  );
  await db.close();
});

it('keeps quotes, semicolons and comments inside the text', () => {
  expect(sql`DELETE FROM note WHERE id = ${"it's; --"}`).toBe(
    "DELETE FROM note WHERE id = 'it''s; --'",
  );
});

it('puts a sign in place of what SQL text cannot hold', () => {
  expect(writeLiteral('a\u0000b\uD800c')).toBe("'a\uFFFDb\uFFFDc'");
});

it('refuses numbers that are none', () => {
  expect(() => writeLiteral(Number.NaN)).toThrow(InvariantError);
});
