import type { PlanStep } from '@/shared/model/plan';
import { formatInches } from '@/shared/units/format-fraction';

const MM_PER_INCH = 25.4;

/** "2.1 mm (12 per inch)": a stitch length as machines show it, and as stitches in an inch. */
export function stitchText(stitchMm: string): string {
  const [over = 0, under = 1] = stitchMm.split('/').map(Number);
  const mm = over / under;
  return `${mm.toFixed(1)} mm (${Math.round(MM_PER_INCH / mm)} per inch)`;
}

/** Short facts of a step for its chips: machine settings and the sizes its title leaves out. */
export function stepFacts(step: PlanStep): string[] {
  const { settings } = step;
  const machine = settings
    ? [
        ...(settings.seam === undefined ? [] : [`${formatInches(settings.seam)} seam`]),
        `Stitch ${stitchText(settings.stitchMm)}`,
        `Needle ${settings.needle}`,
      ]
    : [];
  return [...machine, ...sizeFacts(step)];
}

function sizeFacts({ role, title: { params } }: PlanStep): string[] {
  const inches = (name: string) => formatInches(String(params[name] ?? '0'));
  if (role === 'strip') return ['Across the whole width'];
  if (role === 'tip-trim') return ['Seam only, not the point'];
  if (role === 'tip-turn') return ['Cotton, dry'];
  if (role === 'ring-press') return [params['press'] === 'open' ? 'Seams open' : 'All one way'];
  if (role === 'circle-cut') return [`From a ${inches('square')} square`];
  if (role === 'background-fold') return [`${inches('cut')} square`];
  if (role === 'block-trim') return [`${inches('fromCentre')} each way from the centre`];
  return [];
}
