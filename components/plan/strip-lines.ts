import { count } from '@/components/plan/plan-facts';
import { lastStripLeft } from '@/shared/cutting/last-strip-left';
import type { Plan, PlanStrip } from '@/shared/model/plan';
import { formatFraction, formatInches } from '@/shared/units/format-fraction';
import { toFraction, toText } from '@/shared/units/fraction';

export interface StripLine {
  letter: string;
  /** "1 strip 4 in" */
  across: string;
  /** "5 lengths of 8 in" */
  then: string;
  /** "20 wedges" */
  makes: string;
  /** "17 × 5 in left"; null when nothing is */
  left: string | null;
}

function writeMakes(strip: PlanStrip, wedgesWanted: number): string {
  if (strip.for === 'circle') return count(strip.lengths, 'circle', 'circles');
  if (strip.for === 'background') return count(strip.lengths, 'background', 'backgrounds');
  return count(wedgesWanted, 'wedge', 'wedges');
}

/** What stays of the last strip, the emptiest, after its pieces: an offcut worth keeping. */
function writeLeft(strip: PlanStrip, usableWidth: string): string | null {
  const left = lastStripLeft(strip, toFraction(usableWidth));
  if (left.lte(0)) return null;
  return `${formatFraction(toText(left))} × ${formatInches(strip.height)} left`;
}

/** How each strip is cut, in the order of the fabrics' letters. */
export function listStripLines(plan: Plan): StripLine[] {
  return plan.fabrics.flatMap(({ letter, strips }) =>
    strips.map((strip) => ({
      letter,
      across: `${count(strip.count, 'strip', 'strips')} ${formatInches(strip.height)}`,
      then:
        strip.for === 'wedge'
          ? `${count(strip.lengths, 'length', 'lengths')} of ${formatInches(strip.length)}`
          : `${count(strip.lengths, 'square', 'squares')} ${formatInches(strip.length)}`,
      makes: writeMakes(strip, strip.lengths * strip.each),
      left: writeLeft(strip, plan.request.cloth.usableWidth),
    })),
  );
}
