import { createHash } from 'node:crypto';

import { z } from 'zod';

import { PlanSchema } from '../../../shared/model/plan';
import { PlanRequestSchema } from '../../../shared/model/plan-request';
import { HealthSchema } from '../../../sync/protocol/health';
import { ProblemSchema } from '../../../sync/protocol/problem';
import { SCHEMA_HISTORY, type SchemaRevision } from '../../../sync/protocol/schema-history';

const SCHEMAS: Record<keyof typeof SCHEMA_HISTORY, z.ZodType> = {
  planRequest: PlanRequestSchema,
  plan: PlanSchema,
  problem: ProblemSchema,
  health: HealthSchema,
};
const names = Object.keys(SCHEMAS) as (keyof typeof SCHEMAS)[];

/** JSON with the keys of every object in alphabetical order. */
function canonical(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) => {
    if (typeof part !== 'object' || part === null || Array.isArray(part)) return part;
    return Object.fromEntries(Object.entries(part).sort(([a], [b]) => (a < b ? -1 : 1)));
  });
}

/** Over what is read and what is written: a default or a stripped field shows in one of them. */
function hashOf(schema: z.ZodType): string {
  const read = z.toJSONSchema(schema, { io: 'input' });
  const written = z.toJSONSchema(schema, { io: 'output' });
  return createHash('sha256').update(canonical({ read, written })).digest('hex');
}

const announce = (name: string, sha256: string) =>
  `The ${name} document on the wire has another shape than the one announced.
If nobody should notice, undo the change. If it is meant:
 1. decide by sync/protocol/PROTOCOL.md, "How a shape changes", whether its version must rise;
 2. add a row to the end of SCHEMA_HISTORY.${name} in sync/protocol/schema-history.ts:
    { version: …, sha256: '${sha256}', change: '…' }
 3. tell of it in PROTOCOL.md. Never edit a row that is there.`;

it.each(names)('keeps the %s document as announced', (name) => {
  const announced = SCHEMA_HISTORY[name].at(-1)?.sha256;
  const sha256 = hashOf(SCHEMAS[name]);
  if (sha256 !== announced) throw new Error(announce(name, sha256));
});

it.each([
  ['planRequest', PlanRequestSchema],
  ['plan', PlanSchema],
] as const)('announces the %s by the version that it carries', (name, schema) => {
  expect(SCHEMA_HISTORY[name].at(-1)?.version).toBe(schema.shape.version.value);
});

it.each(names)('lists the shapes of the %s document once each, oldest first', (name) => {
  const rows: readonly SchemaRevision[] = SCHEMA_HISTORY[name];
  const versions = rows.map(({ version }) => version);
  expect(versions).toEqual([...versions].sort((a, b) => a - b));
  expect(new Set(rows.map(({ sha256 }) => sha256)).size).toBe(rows.length);
  for (const { sha256, change } of rows) {
    expect(sha256).toMatch(/^[0-9a-f]{64}$/);
    expect(change).not.toBe('');
  }
});

it('notices a field more, a field less, another type and another limit', () => {
  const base = z.strictObject({ a: z.string().max(5), b: z.int() });
  const moved = [
    base.extend({ c: z.string().optional() }),
    base.omit({ b: true }),
    base.extend({ b: z.number() }),
    base.extend({ a: z.string().max(6) }),
    z.object(base.shape),
  ];
  expect(new Set([base, ...moved].map(hashOf)).size).toBe(moved.length + 1);
});

it('does not mind the order in which the fields are written', () => {
  const [a, b] = [z.string(), z.int()];
  // "required" is a list, and the order of its names means nothing
  expect(hashOf(z.strictObject({ a: a.optional(), b: b.optional() }))).toBe(
    hashOf(z.strictObject({ b: b.optional(), a: a.optional() })),
  );
});
