import type { StepRole } from '@/shared/model/codes';
import type { TemplateLength } from '@/shared/model/length';
import type { Plan, PlanStep } from '@/shared/model/plan';
import { formatExact, formatFraction, formatInches } from '@/shared/units/format-fraction';

type WhyText = (plan: Plan, step: PlanStep) => string;

const inches = (length: TemplateLength): string => `${formatExact(length.exact)} in`;

/** Why a step is done, and how, with this plan's own sizes. */
export const STEP_WHYS: Record<StepRole, WhyText> = {
  strip: ({ geometry: { wedge } }) =>
    `A strip is as tall as a wedge: ${formatInches(wedge.stripHeight)}. Square up the cloth first, then cut from the squared edge across the whole width. One strip holds ${wedge.perStrip} wedges, every other one turned.`,
  length: (plan) =>
    `Each length holds one stack’s wedges and ${formatInches(plan.request.cutting.squaringOff)} to square its two ends. ${lengthText(plan)} Keep what is left of the strip.`,
  stack: (plan) =>
    `One cut through a stack gives one wedge of each fabric in it. Right sides up, same grain, edges lined up; lightest on top, so the ruler’s lines show. ${stackText(plan)}`,
  cut: ({ geometry: { wedge } }) =>
    `Turn every other wedge: each is ${inches(wedge.cutNarrow)} at the narrow edge and ${inches(wedge.cutWide)} at the wide one, so the next begins ${inches(wedge.pitch)} further on. Cut at the exact angle, with the wedge template or the ruler’s line.`,
  'tip-sew': ({ request }) =>
    `Fold each wedge on its axis, right sides together, and sew across the wide end from the fold to the open edges, ${formatInches(request.tip.shape === 'pointed' ? request.tip.seam : request.seam)} from the raw edge. Backstitch at the fold. Feed the next one without cutting the thread between; clip the chain apart at the end.`,
  'tip-trim': ({ request }) =>
    `The ${formatInches(request.tip.shape === 'pointed' ? request.tip.seam : request.seam)} seam is too thick to lie flat inside the tip; ⅛ in is enough. Clip the chain apart, trim the seam only, and clip the corner at the fold just short of the stitches.`,
  'tip-turn': ({ request, geometry }) =>
    request.tip.shape === 'rounded'
      ? `Turn the wide end under over a round template, ${formatInches(request.tip.turnUnder)} all round, and press. The wedge now reaches ${formatInches(geometry.ring.reach)} from the plate’s centre.`
      : `Turn the tip right side out, push the corner out, and press with the seam on the middle of the back. The point is a right angle and reaches ${formatInches(geometry.ring.reach)} from the plate’s centre.`,
  pair: ({ request, geometry }) =>
    `Right sides together, ${outerEnd(request)}s level, ${formatInches(request.seam)} seam. Begin at the ${outerEnd(request)} with a backstitch and sew to the narrow edge; do not cut the thread before the next pair.${shoulderText(geometry.ring.shoulderRadius)}`,
  quarter: ({ request, geometry: { ring } }) =>
    `A quarter of the ring reads ${ring.order.join(' ')} clockwise, over and over. Sew the pairs in that order, from the ${outerEnd(request)}s inward, ${formatInches(request.seam)} seam.`,
  half: ({ request }) =>
    `Two of these make a plate. Lay the units out clockwise and read the letters before sewing, ${formatInches(request.seam)} seam, from the ${outerEnd(request)}s inward.`,
  ring: ({ request, geometry: { ring } }) =>
    `Lay both halves together flat before the last seams. A cup or a gap shows now, while it is easy to take a seam in. The closed ring has ${request.wedges} wedges and reaches ${formatInches(ring.reach)} from its centre.`,
  'ring-press': ({ request }) =>
    request.press === 'open'
      ? `All ${request.wedges} seams open: the ring lies flattest, and no side is thicker than the other. Press down and lift, from the narrow edge outward.`
      : `All ${request.wedges} seams the same way round. Press down and lift, from the narrow edge outward.`,
  'circle-cut': ({ geometry: { circle } }) =>
    circle === null
      ? ''
      : `${formatInches(circle.cutDiameter.cut)} across from a ${formatInches(circle.square)} square. Finished it has a radius of ${inches(circle.finishedRadius)}, so it covers every corner of the hole.`,
  'circle-turn': ({ request, geometry: { circle } }) =>
    circle === null || request.centre.shape === 'none'
      ? ''
      : request.centre.edge === 'fused'
        ? `Bond it with the web’s own heat and time, under a pressing cloth. The edge stays raw, so the circle keeps its ${formatInches(circle.cutDiameter.cut)}.`
        : `Run a gathering thread near the edge, draw it up over a round template, and press ${formatInches(request.centre.turning)} under. The finished radius is ${inches(circle.finishedRadius)}.`,
  'background-cut': ({ geometry: { background } }) =>
    `Cut it ${formatInches(background.cut)} square, larger than the block: it draws in while you stitch. It is trimmed to ${formatInches(background.trim)} afterwards.`,
  'background-fold': ({ request }) =>
    `Fold in half both ways and press a light crease. The lines find the centre; ${request.wedges % 4 === 0 ? 'four ring seams lie on them' : 'the ring is centred on them'}.`,
  'stay-stitch': ({ geometry: { ring } }) =>
    `The opening has bias edges. A line of 2.0 mm stitches just inside the turning keeps its corners at ${inches(ring.holeCorner)} from the centre.`,
  applique: ({ request, geometry: { ring } }) =>
    `Ring on the fold lines, points ${marginText(ring.margin)} from the finished side. ${request.applique === 'hand' ? 'Small stitches, a thread that matches the ring, caught only at the fold.' : 'Stitch close to the folded edge, pivot at each point and each shoulder.'}${request.centre.shape === 'circle' ? ' Then the circle, over the hole, at 1.8 mm.' : ' Then turn the opening under and stitch it.'}`,
  'block-trim': ({ request, geometry: { background } }) =>
    `Measure from the centre, the same to all four sides: ${formatInches(background.trim)} square now, ${formatInches(request.block)} once it is sewn into a quilt.`,
};

/** Where side seams begin: a tip is folded, a flat wedge is not. */
function outerEnd({ tip }: Plan['request']): string {
  return tip.shape === 'flat' ? 'wide end' : 'folded end';
}

function shoulderText(radius: TemplateLength | null): string {
  return radius === null ? '' : ` The shoulders meet ${inches(radius)} from the plate’s centre.`;
}

function marginText(margin: Plan['geometry']['ring']['margin']): string {
  if (typeof margin === 'string') return formatInches(margin);
  return `${formatExact(margin.exact)} in`;
}

function lengthText(plan: Plan): string {
  const sizes = new Set(
    plan.fabrics.flatMap(({ strips }) =>
      strips.flatMap((strip) =>
        strip.for === 'wedge'
          ? [`${formatFraction(strip.length)} in for ${strip.each} wedges`]
          : [],
      ),
    ),
  );
  return `Here ${[...sizes].join(', ')}.`;
}

function stackText(plan: Plan): string {
  const stacks = plan.stacks.map(
    ({ layers, count }) => `${count} of ${layers.length} layers, ${layers.join(' ')} from the top`,
  );
  return `Here ${stacks.join('; ')}.`;
}
