import { itemKind, itemLetters } from '@/components/steps/item-words';
import { finishedHalfWidth } from '@/shared/geometry/finished-half-width';
import type { Plan } from '@/shared/model/plan';
import { formatExact, formatFraction, formatInches } from '@/shared/units/format-fraction';
import { toFraction } from '@/shared/units/fraction';

export interface PieceSizes {
  /** raw size, as it is cut or sewn; null where the item has no size of its own */
  cut: string | null;
  /** size once all its seams are sewn */
  finished: string | null;
}

const NO_SIZE: PieceSizes = { cut: null, finished: null };

/** The cut and finished size of an item of a plan, in words with units. */
export function pieceSizes(item: string, plan: Plan): PieceSizes {
  const { wedge, ring, circle, background } = plan.geometry;
  const reach = formatInches(ring.reach);
  switch (itemKind(item)) {
    case 'strip':
      return {
        cut: `${formatInches(wedge.stripHeight)} tall, ${formatInches(plan.request.cloth.usableWidth)} long`,
        finished: null,
      };
    case 'length':
    case 'stack':
      return { cut: lengthSize(item, plan), finished: null };
    case 'wedge':
    case 'tip-sewn':
    case 'tip-trimmed':
    case 'tip':
      return { cut: wedgeCut(plan), finished: wedgeFinished(plan) };
    case 'ring':
    case 'ring-pressed':
    case 'ring-stayed':
      return { cut: null, finished: `${reach} from the centre to the points` };
    case 'circle':
    case 'circle-ready':
      return circle === null
        ? NO_SIZE
        : {
            cut: `${formatInches(circle.cutDiameter.cut)} across`,
            finished: `radius ${formatExact(circle.finishedRadius.exact)} in`,
          };
    case 'background':
    case 'background-folded':
    case 'plate':
      return {
        cut: `${formatInches(background.cut)} square`,
        finished: `${formatInches(plan.request.block)} square, after trimming`,
      };
    case 'block':
      return {
        cut: `${formatInches(background.trim)} square`,
        finished: `${formatInches(plan.request.block)} square in the quilt`,
      };
    default:
      return NO_SIZE;
  }
}

function lengthSize(item: string, plan: Plan): string | null {
  const letter = itemLetters(item).split('+')[0];
  const strips = plan.fabrics.find((fabric) => fabric.letter === letter)?.strips ?? [];
  const strip = strips.find((each) => each.for === 'wedge');
  return strip ? `${formatFraction(strip.length)} × ${formatInches(strip.height)}` : null;
}

function wedgeCut({ geometry: { wedge } }: Plan): string {
  const narrow = formatExact(wedge.cutNarrow.exact);
  const wide = formatExact(wedge.cutWide.exact);
  return `${narrow} to ${wide} in wide, ${formatInches(wedge.stripHeight)} high`;
}

/** Between its side seams, at the hole and on the line through the tip. */
function wedgeFinished({ geometry: { wedge, ring }, request: { wedges } }: Plan): string {
  const width = (atIn: number) => formatExact(2 * finishedHalfWidth(atIn, wedges));
  const narrow = width(toFraction(wedge.rawNarrowAt).valueOf());
  const wide = width(toFraction(ring.reach).valueOf());
  return `${narrow} in wide at its narrow edge, ${wide} in where the tip is sewn`;
}
