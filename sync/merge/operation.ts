import { z } from 'zod';

import { PlanLaneSchema, PlanStepSchema } from '../../shared/model/plan';
import { PlanRequestSchema } from '../../shared/model/plan-request';
import { TALLY_KINDS } from '../../shared/model/tally';
import { IdentitySchema, SessionSchema } from './identity';

const lane = { step: z.string(), lane: z.string(), tally: z.enum(TALLY_KINDS) };

/** A project begins: its fields, its request and the frozen rows of its plan. */
const BeginSchema = z.strictObject({
  kind: z.literal('project'),
  name: z.string(),
  note: z.string(),
  example: z.boolean(),
  request: PlanRequestSchema,
  engine: z.string(),
  steps: z.array(PlanStepSchema),
});
/** A lane opened after the plan was made. */
const LaneSchema = z.strictObject({
  kind: z.literal('lane'),
  step: z.string(),
  lane: PlanLaneSchema,
});
const TapSchema = z.strictObject({ kind: z.literal('tap'), ...lane, delta: z.int() });
/** Takes back exactly its target, once; `delta` is −n of a tap and 0 of a set. */
const UndoSchema = z.strictObject({
  kind: z.literal('undo'),
  ...lane,
  target: IdentitySchema,
  delta: z.int(),
});
const SetSchema = z.strictObject({
  kind: z.literal('set'),
  ...lane,
  want: z.int().min(0),
  offset: z.int(),
  base: IdentitySchema.nullable(),
});
export const FIELDS = ['name', 'note'] as const;
export type FieldName = (typeof FIELDS)[number];
const FieldSchema = z.strictObject({
  kind: z.literal('field'),
  field: z.enum(FIELDS),
  value: z.string(),
  base: IdentitySchema,
});
/** `seen`: XOR of the hashes of all edits of the row that the deleter had seen. */
const DeleteSchema = z.strictObject({
  kind: z.literal('delete'),
  seen: z.string().regex(/^[0-9a-f]{16}$/),
});
/** Out of the bin again: an edit, so that an older delete no longer has seen them all. */
const RestoreSchema = z.strictObject({ kind: z.literal('restore') });

export const ActSchema = z.discriminatedUnion('kind', [
  BeginSchema,
  LaneSchema,
  TapSchema,
  UndoSchema,
  SetSchema,
  FieldSchema,
  DeleteSchema,
  RestoreSchema,
]);
export type Act = z.output<typeof ActSchema>;

/** One act of one project's scope, as the outbox keeps it and a copy of the store carries it. */
export const OperationSchema = z.strictObject({
  scope: z.string(),
  session: SessionSchema,
  seq: z.int().min(1),
  timeMs: z.int(), // of the writer's hybrid clock
  act: ActSchema,
});
export type Operation = z.output<typeof OperationSchema>;
