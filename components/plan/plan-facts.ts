import type { Length } from '@/shared/model/length';
import type { Plan, PlanStack } from '@/shared/model/plan';
import { formatExact, formatInches, formatYards } from '@/shared/units/format-fraction';
import { toFraction, toText } from '@/shared/units/fraction';

export interface Fact {
  label: string;
  value: string;
}

/** A length as a maker reads it: the size she cuts, or two decimals for what no ruler shows. */
export function writeLength(length: Length): string {
  if (typeof length === 'string') return formatInches(length);
  return 'cut' in length ? formatInches(length.cut) : `${formatExact(length.exact)} in`;
}

/** "1 strip", "8 strips" */
export function count(number: number, one: string, many: string): string {
  return `${number} ${number === 1 ? one : many}`;
}

/** "5 stacks of 5 layers, 4 cuts each" */
export function writeStack(stack: PlanStack): string {
  const stacks = count(stack.count, 'stack', 'stacks');
  const layers = count(stack.layers.length, 'layer', 'layers');
  return `${stacks} of ${layers}, ${count(stack.cutsEach, 'cut', 'cuts')}${stack.count > 1 ? ' each' : ''}`;
}

/** "8 strips, 1½ yd" */
export function writeTotals({ totals }: Plan): string {
  return `${count(totals.strips, 'strip', 'strips')}, ${formatYards(totals.buyYards)}`;
}

/** An angle in degrees, two decimals at most. */
function degrees(wedges: number): string {
  return `${Math.round(36000 / wedges) / 100}°`;
}

/** What a maker wants to know of the shapes before she buys. */
export function listFacts({ request, geometry, stacks }: Plan): Fact[] {
  const { wedge, ring, circle, background } = geometry;
  const across = toText(toFraction(ring.reach).mul(2));
  const edges = `${formatExact(wedge.cutNarrow.exact)} / ${formatExact(wedge.cutWide.exact)} in`;
  const facts: Fact[] = [
    { label: 'Each wedge', value: degrees(request.wedges) },
    { label: 'Cut strip height', value: formatInches(wedge.stripHeight) },
    { label: 'Narrow / wide edge', value: edges },
    { label: 'Wedges a strip', value: String(wedge.perStrip) },
    { label: 'Plate across', value: formatInches(across) },
    { label: 'Margin', value: writeLength(ring.margin) },
    ...stacks.map((stack) => ({
      label: `Stack ${stack.layers.join(' ')}`,
      value: writeStack(stack),
    })),
  ];
  if (circle)
    facts.push({
      label: 'Circle drawn',
      value: `${writeLength(circle.cutDiameter)}, from a ${formatInches(circle.square)} square`,
    });
  const { cut, trim } = background;
  facts.push({
    label: 'Background',
    value: `${formatInches(cut)}, trimmed to ${formatInches(trim)}`,
  });
  return facts;
}
