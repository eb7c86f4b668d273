import type { Replacement } from '@/shared/cutting/find-replacement';
import type { Plan } from '@/shared/model/plan';
import { formatFraction, formatInches, formatYards } from '@/shared/units/format-fraction';

/** Where the cloth for recut pieces comes from, in a sentence or two. */
export function replacementText(plan: Plan, replacement: Replacement): string {
  const { letter } = replacement;
  if (replacement.from === 'buy') {
    const { widestLeft, needed, yards } = replacement;
    return `No offcut is wide enough: ${formatInches(widestLeft)} left of a strip, ${formatInches(needed)} needed. Buy ${formatYards(yards)} of ${letter}.`;
  }
  if (replacement.from === 'slack') {
    const { spare, needed } = replacement;
    return `No offcut is wide enough. Cut another strip: ${formatInches(needed)} of the ${formatInches(spare)} to spare in ${letter}.`;
  }
  const { left, height } = replacement;
  const size = `${formatFraction(left)} × ${formatInches(height)}`;
  return `Cut it from the ${size} left of the ${stripName(plan, letter, height)} strip.`;
}

function stripName(plan: Plan, letter: string, height: string): string {
  const strips = plan.fabrics.find((fabric) => fabric.letter === letter)?.strips ?? [];
  const strip = strips.find((each) => each.height === height);
  return strip ? strip.for : letter;
}
