import { joinWords } from '@/components/station/enough-text';
import type { WarningCode } from '@/shared/model/codes';
import type { Plan, PlanWarning } from '@/shared/model/plan';
import { formatExact, formatInches, formatYards } from '@/shared/units/format-fraction';

export interface WarningText {
  title: string;
  text: string;
  /** the next eighth of a yard, to be bought of this fabric */
  offer?: { label: string; letter: string; buyYards: string };
}

type Params = PlanWarning['params'];
type Words = Pick<WarningText, 'title' | 'text'>;

function inches(value: string | number | undefined): string {
  if (value === undefined) return '0 in';
  return typeof value === 'number' ? `${formatExact(value)} in` : formatInches(value);
}

const yards = (value: string | number | undefined) => formatYards(String(value ?? '0'));
const letters = (value: string | number | undefined) => String(value ?? '').split('+');

/** What a maker reads for each code; `name` is the first named fabric's own name. */
const TEXTS: Record<WarningCode, (params: Params, name: string, plan: Plan) => Words> = {
  noSlack: ({ needs, buyYards }, name) => ({
    title: `No slack in ${name}.`,
    text: `All ${inches(needs)} of ${yards(buyYards)} used.`,
  }),
  littleSlack: ({ spare }, name) => ({
    title: `${inches(spare)} spare in ${name}.`,
    text: 'A crooked first cut needs more.',
  }),
  stripEndShort: ({ left }, name) => ({
    title: `${inches(left)} left at a strip's end in ${name}.`,
    text: 'Square up the end with a thin shaving.',
  }),
  anotherStripAt40: ({ strips, atForty }, name) => ({
    title: `${atForty} strips of ${name} if the cloth is narrow.`,
    text: `At 40 in usable, ${strips} will not do. Measure before you buy.`,
  }),
  capExceeded: ({ layers, cap }) => ({
    title: `${layers} layers, your cap is ${cap}.`,
    text: 'A thick stack slips under the ruler. Set fewer layers, or cut slowly.',
  }),
  oneFabric: (_, name) => ({
    title: '1 wedge fabric.',
    text: `Every seam joins ${name} to ${name}.`,
  }),
  neighboursClash: (_, __, plan) => ({
    title: '2 neighbours match.',
    text: `2 fabrics cannot take turns round ${plan.request.wedges} wedges. Use an even number, or a third fabric.`,
  }),
  lastWedgeChanged: ({ fabric, instead }) => ({
    title: `The last wedge is ${fabric}, not ${instead}.`,
    text: 'So no two neighbours match.',
  }),
  extraWedges: ({ fabrics, count, left }) => ({
    title: `${count} more a plate of ${joinWords(letters(fabrics))}.`,
    text: left
      ? `Every cut gives one of each, so some of ${joinWords(letters(left))} stay over.`
      : 'The wedges do not share out evenly over the fabrics.',
  }),
  dominantOffDiagonals: ({ axes }, name, plan) => ({
    title: `${name} is not on every diagonal.`,
    text:
      axes === 0
        ? `With ${plan.request.wedges} wedges a seam or nothing lies there. 12, 20 or 28 wedges bring a wedge.`
        : 'This many fabrics do not come round to all four. Add or take away one.',
  }),
  noQuarters: ({ wedges }) => ({
    title: `${wedges} wedges make no quarters.`,
    text: 'The ring is sewn in 2 halves.',
  }),
  flapBelowHole: ({ reaches, hole }) => ({
    title: 'The tip’s flap shows in the hole.',
    text: `It reaches to ${inches(reaches)} from the centre, the hole to ${inches(hole)}. Trim it back.`,
  }),
  smallMargin: ({ margin }) => ({
    title: `${inches(margin)} from tip to block edge.`,
    text: 'Little room to trim. Cut a lower strip for more.',
  }),
};

/** A plan's warning in words, with its offer to buy the next eighth of a yard when it has one. */
export function warningText(warning: PlanWarning, plan: Plan): WarningText {
  const { fabric, offerYards } = warning.params;
  const letter = String(fabric ?? '');
  const found = plan.request.fabrics.find((candidate) => candidate.letter === letter);
  const words = TEXTS[warning.code](warning.params, found?.name ?? letter, plan);
  if (offerYards === undefined || letter === '') return words;
  const buyYards = String(offerYards);
  return { ...words, offer: { label: `Buy ${yards(buyYards)}`, letter, buyYards } };
}
