import { z } from 'zod';

import { FractionTextSchema } from './length';

/** One fabric of a request. `buyYards` is there once the maker took an offer to buy more. */
export const RequestFabricSchema = z.strictObject({
  letter: z.string().regex(/^[A-Z]$/),
  name: z.string().trim().min(1).max(60),
  role: z.enum(['wedge', 'background', 'circle']),
  colour: z.string().regex(/^#[0-9A-F]{6}$/),
  oneWay: z.boolean(),
  dominant: z.boolean(),
  buyYards: FractionTextSchema.optional(),
});

const TipSchema = z.discriminatedUnion('shape', [
  z.strictObject({ shape: z.literal('pointed'), seam: FractionTextSchema }),
  z.strictObject({ shape: z.literal('rounded'), turnUnder: FractionTextSchema }),
  z.strictObject({ shape: z.literal('flat'), turnUnder: FractionTextSchema }),
]);

const CentreSchema = z.discriminatedUnion('shape', [
  z.strictObject({
    shape: z.literal('circle'),
    fabric: z.string().regex(/^[A-Z]$/),
    overlap: FractionTextSchema,
    edge: z.enum(['turned', 'fused']),
    turning: FractionTextSchema,
  }),
  z.strictObject({ shape: z.literal('none'), turnUnder: FractionTextSchema }),
]);

/** What a plan of ring blocks is computed from. Lengths in inches as exact fractions. */
export const PlanRequestSchema = z.strictObject({
  kind: z.literal('planRequest'),
  version: z.literal(1),
  family: z.literal('ring'),
  blocks: z.int(),
  block: FractionTextSchema,
  wedges: z.int(),
  seam: FractionTextSchema,
  tip: TipSchema,
  narrowAt: FractionTextSchema,
  stripHeight: FractionTextSchema,
  centre: CentreSchema,
  background: z.strictObject({
    fabric: z.string().regex(/^[A-Z]$/),
    trimAllowance: FractionTextSchema,
  }),
  press: z.enum(['open', 'side']),
  applique: z.enum(['machine', 'hand']),
  cloth: z.strictObject({ usableWidth: FractionTextSchema, shrinkPercent: FractionTextSchema }),
  cutting: z.strictObject({
    stacking: z.literal('oneOfEach'),
    bladeMm: z.union([z.literal(18), z.literal(28), z.literal(45), z.literal(60)]),
    cap: z.int(),
    layers: z.int().optional(), // set by the maker herself; above the cap it is only warned of
    squaringOff: FractionTextSchema,
  }),
  fabrics: z.array(RequestFabricSchema).max(26),
});
export type PlanRequest = z.output<typeof PlanRequestSchema>;
export type RequestFabric = z.output<typeof RequestFabricSchema>;
