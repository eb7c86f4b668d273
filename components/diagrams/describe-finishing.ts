import type { Describe } from '@/components/diagrams/describe';
import { circleSizes } from '@/shared/geometry/drawing/circle-sizes';
import { halfOf } from '@/shared/geometry/drawing/to-inches';
import type { StepRole } from '@/shared/model/codes';
import { formatExact, formatInches } from '@/shared/units/format-fraction';

type FinishingRole = Extract<
  StepRole,
  'circle-turn' | 'background-fold' | 'stay-stitch' | 'applique' | 'block-trim'
>;

const circleTurn: Describe = (plan) => {
  const sizes = circleSizes(plan);
  const { centre } = plan.request;
  if (!sizes || centre.shape !== 'circle') return 'No centre circle: the hole stays open.';
  const across = `${formatExact(2 * sizes.finishedIn)} in across`;
  if (centre.edge === 'fused') return `The circle fused flat, its edge raw, ${across}.`;
  return `The circle's edge turned ${formatInches(centre.turning)} to the back over a template: ${across}.`;
};

const backgroundFold: Describe = (plan) =>
  `The ${formatInches(plan.geometry.background.cut)} background folded in half, in half again, and opened out. Its two creases cross in the centre.`;

const stayStitch: Describe = (plan) => {
  const { centre } = plan.request;
  const turn = centre.shape === 'none' ? formatInches(centre.turnUnder) : 'edge';
  return `A line of stitches around the open hole, on the ${turn} that is turned under.`;
};

const applique: Describe = (plan) => {
  const { wedges, centre } = plan.request;
  const place =
    wedges % 4 === 0 ? 'four of its seams on the fold lines' : 'its first seam on a fold line';
  const inner = centre.shape === 'circle' ? 'the circle' : 'the open hole';
  return `The ring on the background, ${place}. Stitch around its outer edge and around ${inner}.`;
};

const blockTrim: Describe = (plan) => {
  const { trim } = plan.geometry.background;
  return `The block trimmed to ${formatInches(trim)}: ${formatInches(halfOf(trim))} each way from its centre.`;
};

/** How the ring becomes a block, in words. */
export const describeFinishing: Record<FinishingRole, Describe> = {
  'circle-turn': circleTurn,
  'background-fold': backgroundFold,
  'stay-stitch': stayStitch,
  applique,
  'block-trim': blockTrim,
};
