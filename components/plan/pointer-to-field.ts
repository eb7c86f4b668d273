import type { FieldName } from '@/components/plan/field-names';

const FIELDS: Record<string, FieldName> = {
  '/block': 'block',
  '/blocks': 'blocks',
  '/wedges': 'wedges',
  '/seam': 'seam',
  '/tip': 'tip',
  '/tip/seam': 'seam',
  '/tip/shape': 'tip',
  '/tip/turnUnder': 'tip',
  '/narrowAt': 'narrowAt',
  '/stripHeight': 'stripHeight',
  '/centre': 'centre',
  '/centre/shape': 'centre',
  '/centre/fabric': 'circleFabric',
  '/centre/overlap': 'overlap',
  '/centre/edge': 'centre',
  '/centre/turning': 'centre',
  '/centre/turnUnder': 'centre',
  '/background/fabric': 'fabrics',
  '/background/trimAllowance': 'trimAllowance',
  '/cloth/usableWidth': 'usableWidth',
  '/cloth/shrinkPercent': 'shrinkPercent',
  '/cutting/bladeMm': 'bladeMm',
  '/cutting/cap': 'cap',
  '/cutting/layers': 'layers',
  '/fabrics': 'fabrics',
};

/** The form's field that a refusal's JSON pointer stands for; `form` when there is none. */
export function pointerToField(pointer: string): FieldName {
  const fabric = /^\/fabrics\/(\d+)(\/|$)/.exec(pointer);
  if (fabric) return `fabric:${Number(fabric[1])}`;
  return FIELDS[pointer] ?? 'form';
}
