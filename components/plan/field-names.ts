/** The sizes of the form that are typed; each may follow its default. */
export const SIZE_FIELDS = [
  'block',
  'blocks',
  'wedges',
  'usableWidth',
  'stripHeight',
  'narrowAt',
  'seam',
  'shrinkPercent',
  'overlap',
  'trimAllowance',
  'cap',
  'layers',
] as const;
export type SizeField = (typeof SIZE_FIELDS)[number];

/** What is counted in whole numbers; the other sizes are lengths, or per cent for shrinkage. */
export const COUNT_FIELDS: readonly SizeField[] = ['blocks', 'wedges', 'cap', 'layers'];

/** Sizes without a default to follow. */
export const ALWAYS_TYPED: readonly SizeField[] = ['block', 'blocks', 'wedges'];

/** Everything beside which an error can stand; `fabric:<place in the list>` for one fabric. */
export type FieldName =
  | SizeField
  | 'tip'
  | 'centre'
  | 'circleFabric'
  | 'bladeMm'
  | 'fabrics'
  | `fabric:${number}`
  | 'form';
export type FieldErrors = Partial<Record<FieldName, string>>;

/** The form's fields in reading order, so that the first wrong one can be found. */
const FIELD_ORDER: readonly FieldName[] = [
  'block',
  'blocks',
  'wedges',
  'usableWidth',
  'tip',
  'centre',
  'circleFabric',
  'fabrics',
  'bladeMm',
  'cap',
  'layers',
  'stripHeight',
  'narrowAt',
  'seam',
  'overlap',
  'trimAllowance',
  'shrinkPercent',
  'form',
];

/** The fields behind "More", which opens by itself when one of them is wrong. */
export const MORE_FIELDS: readonly SizeField[] = [
  'stripHeight',
  'narrowAt',
  'seam',
  'overlap',
  'trimAllowance',
  'shrinkPercent',
];

/** The first wrong field in reading order; fabrics stand where their list stands. */
export function findFirstError(errors: FieldErrors): FieldName | null {
  const wrong = Object.keys(errors) as FieldName[];
  const place = (field: FieldName) =>
    FIELD_ORDER.indexOf(field.startsWith('fabric:') ? 'fabrics' : field);
  return [...wrong].sort((one, other) => place(one) - place(other))[0] ?? null;
}
