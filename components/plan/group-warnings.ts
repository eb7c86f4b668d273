import { type WarningText, warningText } from '@/components/plan/messages';
import { joinWords } from '@/components/station/enough-text';
import type { Plan, PlanWarning } from '@/shared/model/plan';
import { formatInches } from '@/shared/units/format-fraction';

export interface WarningGroup {
  title: string;
  text: string;
  offer: { label: string; letters: string[]; buyYards: string } | null;
}

function alone({ title, text, offer }: WarningText): WarningGroup {
  if (!offer) return { title, text, offer: null };
  const { label, letter, buyYards } = offer;
  return { title, text, offer: { label, letters: [letter], buyYards } };
}

function together(alike: readonly PlanWarning[], plan: Plan): WarningGroup | null {
  const [first] = alike;
  const own = first && warningText(first, plan);
  if (!first || !own?.offer) return null;
  if (alike.length === 1) return alone(own);
  const letters = alike.map(({ params }) => String(params.fabric));
  const { label, buyYards } = own.offer;
  return {
    title: `${formatInches(String(first.params.spare))} spare in ${joinWords(letters)}.`,
    text: own.text,
    offer: { label: `${label} of each`, letters, buyYards },
  };
}

/** A plan's warnings in words; fabrics that are short by the same share one, and one offer. */
export function groupWarnings(plan: Plan): WarningGroup[] {
  const little = plan.warnings.filter(({ code }) => code === 'littleSlack');
  const keyOf = ({ params }: PlanWarning) => `${params.spare} ${params.offerYards}`;
  return plan.warnings.flatMap((warning) => {
    if (warning.code !== 'littleSlack') return [alone(warningText(warning, plan))];
    const alike = little.filter((other) => keyOf(other) === keyOf(warning));
    const group = alike[0] === warning ? together(alike, plan) : null;
    return group ? [group] : [];
  });
}
