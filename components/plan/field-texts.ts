import { COUNT_FIELDS, type SizeField } from '@/components/plan/field-names';
import type { PlanRequest } from '@/shared/model/plan-request';
import { formatFraction } from '@/shared/units/format-fraction';
import { toFraction, toText } from '@/shared/units/fraction';
import { parseLength } from '@/shared/units/parse-length';

export type SizeReading =
  | { ok: true; value: string }
  | { ok: false; kind: 'not-a-length' | 'not-positive' | 'not-a-count' | 'not-a-percentage' };

/**
 * Reads what was typed into a size: a length, a whole number, or per cent for shrinkage (0 is one).
 *
 * @returns exact fraction text
 */
export function readSize(field: SizeField, text: string): SizeReading {
  if (COUNT_FIELDS.includes(field)) {
    const plain = text.trim();
    if (/^[+-]?0+$|^-\d+$/.test(plain)) return { ok: false, kind: 'not-positive' };
    if (!/^\d{1,6}$/.test(plain)) return { ok: false, kind: 'not-a-count' };
    return { ok: true, value: String(Number(plain)) };
  }
  if (field !== 'shrinkPercent') return parseLength(text);
  const plain = text.replace(/%\s*$/, '').trim();
  if (/^0+([.,]0+)?$/.test(plain)) return { ok: true, value: '0' };
  const percent = parseLength(plain);
  if (percent.ok || percent.kind === 'not-positive') return percent;
  return { ok: false, kind: 'not-a-percentage' };
}

/** A size of a request as the form shows it; empty where the request has none. */
export function writeSize(field: SizeField, request: PlanRequest): string {
  const { centre, cutting } = request;
  switch (field) {
    case 'block':
    case 'seam':
    case 'narrowAt':
    case 'stripHeight':
      return formatFraction(request[field]);
    case 'blocks':
    case 'wedges':
      return String(request[field]);
    case 'usableWidth':
    case 'shrinkPercent':
      return formatFraction(request.cloth[field]);
    case 'overlap':
      return centre.shape === 'circle' ? formatFraction(centre.overlap) : '';
    case 'trimAllowance':
      return formatFraction(request.background.trimAllowance);
    case 'cap':
      return String(cutting.cap);
    case 'layers':
      return cutting.layers === undefined ? '' : String(cutting.layers);
  }
}

const STEPS: Partial<Record<SizeField, string>> = {
  stripHeight: '1/4',
  narrowAt: '1/8',
  seam: '1/16',
  overlap: '1/8',
  trimAllowance: '1/2',
};

/** The text one step up or down; null when the text cannot be read or would not be positive. */
export function stepSize(field: SizeField, text: string, by: 1 | -1): string | null {
  const read = readSize(field, text);
  if (!read.ok) return null;
  const next = toFraction(read.value).add(toFraction(STEPS[field] ?? '1').mul(by));
  const nothingLeft = field === 'shrinkPercent' ? next.lt(0) : next.lte(0);
  if (nothingLeft) return null;
  return formatFraction(toText(next));
}
