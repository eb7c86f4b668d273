import { z } from 'zod';

import { SIZE_FIELDS } from '@/components/plan/field-names';
import { BACKGROUND_CLOTH, PALETTE } from '@/components/plan/fabric-palette';
import { FractionTextSchema } from '@/shared/model/length';

const DraftFabricSchema = z.object({
  id: z.string(),
  name: z.string(),
  colour: z.string(),
  oneWay: z.boolean(),
  dominant: z.boolean(),
  buyYards: FractionTextSchema.optional(),
});
export type DraftFabric = z.output<typeof DraftFabricSchema>;

/** What the maker typed and chose, as she typed it. A size that is not there follows its default. */
export const SetupDraftSchema = z.object({
  version: z.literal(1),
  name: z.string(),
  texts: z.partialRecord(z.enum(SIZE_FIELDS), z.string()),
  tip: z.enum(['pointed', 'rounded', 'flat']),
  centre: z.enum(['circle', 'none']),
  circleFabric: z.string().nullable(), // a fabric's id; null: the starred one, else the first
  wedgeFabrics: z.array(DraftFabricSchema),
  background: DraftFabricSchema,
  circleCloth: DraftFabricSchema.nullable(), // a cloth used for the circle alone
  bladeMm: z.union([z.literal(18), z.literal(28), z.literal(45), z.literal(60)]).nullable(),
  press: z.enum(['open', 'side']),
  applique: z.enum(['machine', 'hand']),
  circleEdge: z.enum(['turned', 'fused']),
  // turnings of a copied plan, which the form shows nowhere
  carried: z.object({
    tipTurning: FractionTextSchema.optional(),
    holeTurnUnder: FractionTextSchema.optional(),
    circleTurning: FractionTextSchema.optional(),
    squaringOff: FractionTextSchema.optional(),
  }),
});
export type SetupDraft = z.output<typeof SetupDraftSchema>;

/** Four fabrics and a background, one 16-inch plate: a form that is a plan from the start. */
export function startDraft(): SetupDraft {
  return {
    version: 1,
    name: '',
    texts: { block: '16', blocks: '1', wedges: '16' },
    tip: 'pointed',
    centre: 'circle',
    circleFabric: null,
    wedgeFabrics: PALETTE.slice(0, 4).map((cloth, at) => ({
      ...cloth,
      id: `f${at + 1}`,
      oneWay: false,
      dominant: false,
    })),
    background: { ...BACKGROUND_CLOTH, id: 'background', oneWay: false, dominant: false },
    circleCloth: null,
    bladeMm: null,
    press: 'open',
    applique: 'machine',
    circleEdge: 'turned',
    carried: {},
  };
}
