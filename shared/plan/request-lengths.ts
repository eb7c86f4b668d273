import type { FractionText } from '../model/length';
import type { PlanRequest } from '../model/plan-request';

/** Limits of one length of a request; both ends are allowed unless `above` 0 is asked for. */
export interface LengthField {
  pointer: string;
  value: FractionText;
  /** 0 and less are refused as not positive */
  positive?: boolean;
  least?: FractionText;
  most?: FractionText;
}

const SEAM_MOST = '1';

/** Every length of a request with its own limits; what lengths do to each other comes later. */
export function requestLengths(request: PlanRequest): LengthField[] {
  const { seam, narrowAt, stripHeight, background, cloth, cutting } = request;
  const buys = request.fabrics.flatMap(({ buyYards }, index): LengthField[] =>
    buyYards === undefined
      ? []
      : [{ pointer: `/fabrics/${index}/buyYards`, value: buyYards, positive: true, most: '1000' }],
  );
  return [
    { pointer: '/block', value: request.block, positive: true, least: '4', most: '60' },
    { pointer: '/seam', value: seam, positive: true, most: SEAM_MOST },
    tipLength(request.tip),
    { pointer: '/narrowAt', value: narrowAt, positive: true },
    { pointer: '/stripHeight', value: stripHeight, positive: true },
    ...centreLengths(request.centre),
    {
      pointer: '/background/trimAllowance',
      value: background.trimAllowance,
      least: '0',
      most: '12',
    },
    { pointer: '/cloth/usableWidth', value: cloth.usableWidth, positive: true, most: '200' },
    { pointer: '/cloth/shrinkPercent', value: cloth.shrinkPercent, least: '0' },
    { pointer: '/cutting/squaringOff', value: cutting.squaringOff, least: '0', most: '4' },
    ...buys,
  ];
}

function tipLength(tip: PlanRequest['tip']): LengthField {
  return tip.shape === 'pointed'
    ? { pointer: '/tip/seam', value: tip.seam, positive: true, most: SEAM_MOST }
    : { pointer: '/tip/turnUnder', value: tip.turnUnder, positive: true, most: SEAM_MOST };
}

function centreLengths(centre: PlanRequest['centre']): LengthField[] {
  if (centre.shape === 'none') {
    const { turnUnder } = centre;
    return [{ pointer: '/centre/turnUnder', value: turnUnder, positive: true, most: SEAM_MOST }];
  }
  const { overlap, turning, edge } = centre;
  return [
    { pointer: '/centre/overlap', value: overlap, positive: true },
    edge === 'turned'
      ? { pointer: '/centre/turning', value: turning, positive: true, most: SEAM_MOST }
      : { pointer: '/centre/turning', value: turning, least: '0', most: SEAM_MOST },
  ];
}
