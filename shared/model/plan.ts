import { z } from 'zod';

import { CAUTIONS, DIAGRAMS, MISTAKES, REFUSALS, STATIONS, STEP_ROLES, WARNINGS } from './codes';
import {
  FractionTextSchema,
  LengthSchema,
  RoundedLengthSchema,
  TemplateLengthSchema,
} from './length';
import { PlanRequestSchema } from './plan-request';

const CountSchema = z.int().min(0);
const ParamsSchema = z.record(z.string(), z.union([z.string(), z.number()]));

/** A text as key and parameters; the words live in the catalogues of components. */
export const MessageSchema = z.strictObject({ key: z.string(), params: ParamsSchema });
export type Message = z.output<typeof MessageSchema>;

/**
 * A countable kind of work of one step. One tap takes `consumes` and gives `makes`; an item is
 * named "kind" or "kind:fabrics", as "wedge:A" or "pair:A+B".
 */
export const PlanLaneSchema = z.strictObject({
  key: z.string(),
  target: CountSchema,
  consumes: z.record(z.string(), z.union([z.int().positive(), FractionTextSchema])),
  makes: z.record(z.string(), z.int().positive()),
});
export type PlanLane = z.output<typeof PlanLaneSchema>;

export const StepSettingsSchema = z.strictObject({
  stitchMm: FractionTextSchema,
  needle: z.string(),
  seam: FractionTextSchema.optional(),
});

export const PlanStepSchema = z.strictObject({
  key: z.string(),
  role: z.enum(STEP_ROLES),
  position: z.int().min(1),
  station: z.enum(STATIONS),
  target: CountSchema, // pieces or units, not taps
  title: MessageSchema,
  why: MessageSchema,
  lanes: z.array(PlanLaneSchema),
  diagram: z.enum(DIAGRAMS),
  settings: StepSettingsSchema.nullable(),
  cautions: z.array(z.enum(CAUTIONS)),
  mistakes: z.array(z.enum(MISTAKES)),
});
export type PlanStep = z.output<typeof PlanStepSchema>;

const PointSchema = z.tuple([z.number(), z.number()]);

export const PlanGeometrySchema = z.strictObject({
  wedge: z.strictObject({
    rawNarrowAt: FractionTextSchema,
    rawWideAt: FractionTextSchema,
    stripHeight: FractionTextSchema,
    cutNarrow: TemplateLengthSchema,
    cutWide: TemplateLengthSchema,
    pitch: TemplateLengthSchema,
    perStrip: CountSchema,
    stripLeft: TemplateLengthSchema,
    outline: z.array(PointSchema), // [x from the plate's centre, y across], raw edges, for drawing
  }),
  ring: z.strictObject({
    reach: FractionTextSchema,
    margin: LengthSchema, // an exact fraction, or a template length for a flat chord
    marginSeamsOnFolds: TemplateLengthSchema.nullable(), // null unless n mod 4 = 0
    shoulderAt: TemplateLengthSchema.nullable(), // null for a flat tip
    shoulderRadius: TemplateLengthSchema.nullable(),
    holeCorner: TemplateLengthSchema,
    order: z.array(z.string()), // fabric letters of one round, clockwise from 12 o'clock
  }),
  circle: z
    .strictObject({
      finishedRadius: TemplateLengthSchema,
      cutDiameter: RoundedLengthSchema,
      square: FractionTextSchema,
    })
    .nullable(),
  background: z.strictObject({ cut: FractionTextSchema, trim: FractionTextSchema }),
});
export type PlanGeometry = z.output<typeof PlanGeometrySchema>;

export const PlanStripSchema = z.strictObject({
  height: FractionTextSchema,
  count: CountSchema,
  for: z.enum(['wedge', 'circle', 'background']),
  lengths: CountSchema, // pieces cut off these strips, all together
  length: FractionTextSchema,
  each: CountSchema, // wedges, circles or backgrounds from one such length
});
export const PlanFabricSchema = z.strictObject({
  letter: z.string(),
  strips: z.array(PlanStripSchema),
  needs: FractionTextSchema, // inches along the cloth
  buyYards: FractionTextSchema,
  spare: FractionTextSchema, // inches along the cloth
});
export type PlanFabric = z.output<typeof PlanFabricSchema>;
export type PlanStrip = z.output<typeof PlanStripSchema>;

export const PlanStackSchema = z.strictObject({
  layers: z.array(z.string()), // from the top, lightest first
  count: CountSchema,
  cutsEach: CountSchema,
  perCut: CountSchema,
  pieces: CountSchema,
});
export type PlanStack = z.output<typeof PlanStackSchema>;

export const PlanWarningSchema = z.strictObject({ code: z.enum(WARNINGS), params: ParamsSchema });
export type PlanWarning = z.output<typeof PlanWarningSchema>;

/** A computed plan: plain JSON, the same text on every engine. */
export const PlanSchema = z.strictObject({
  kind: z.literal('plan'),
  version: z.literal(1),
  engine: z.string(),
  request: PlanRequestSchema,
  geometry: PlanGeometrySchema,
  fabrics: z.array(PlanFabricSchema),
  totals: z.strictObject({
    strips: CountSchema,
    buyYards: FractionTextSchema,
    wedges: CountSchema,
  }),
  stacks: z.array(PlanStackSchema),
  warnings: z.array(PlanWarningSchema),
  steps: z.array(PlanStepSchema),
});
export type Plan = z.output<typeof PlanSchema>;

/** Why a request is refused: the field by JSON pointer, a code, and what would work. */
export const PlanRefusalSchema = z.strictObject({
  pointer: z.string(),
  code: z.enum(REFUSALS),
  params: ParamsSchema,
});
export type PlanRefusal = z.output<typeof PlanRefusalSchema>;
