import { z } from 'zod';

/** An exact rational as text: "4", "17/4", lowest terms, denominator above 1 when written. */
export const FractionTextSchema = z.string().regex(/^-?\d+(\/[1-9]\d*)?$/);
export type FractionText = z.output<typeof FractionTextSchema>;

/** An irrational length: 9 decimals, and how it is cut. Templates are cut at the exact size. */
export const TemplateLengthSchema = z.strictObject({
  exact: z.number(),
  policy: z.literal('template'),
});
export const RoundedLengthSchema = z.strictObject({
  exact: z.number(),
  cut: FractionTextSchema,
  policy: z.literal('upToEighth'),
});

/** A length of a plan, in inches; never a bare rounded number. */
export const LengthSchema = z.union([
  FractionTextSchema,
  TemplateLengthSchema,
  RoundedLengthSchema,
]);
export type TemplateLength = z.output<typeof TemplateLengthSchema>;
export type Length = z.output<typeof LengthSchema>;
