import type { FractionText } from '../model/length';
import type { PlanRequest } from '../model/plan-request';
import { toFraction, toText } from '../units/fraction';

/** The same request with every length in lowest terms, so that equal requests are equal text. */
export function normaliseRequest(request: PlanRequest): PlanRequest {
  const { tip, centre, background, cloth, cutting } = request;
  return {
    ...request,
    block: lowest(request.block),
    seam: lowest(request.seam),
    tip:
      tip.shape === 'pointed'
        ? { ...tip, seam: lowest(tip.seam) }
        : { ...tip, turnUnder: lowest(tip.turnUnder) },
    narrowAt: lowest(request.narrowAt),
    stripHeight: lowest(request.stripHeight),
    centre:
      centre.shape === 'circle'
        ? { ...centre, overlap: lowest(centre.overlap), turning: lowest(centre.turning) }
        : { ...centre, turnUnder: lowest(centre.turnUnder) },
    background: { ...background, trimAllowance: lowest(background.trimAllowance) },
    cloth: {
      usableWidth: lowest(cloth.usableWidth),
      shrinkPercent: lowest(cloth.shrinkPercent),
    },
    cutting: { ...cutting, squaringOff: lowest(cutting.squaringOff) },
    fabrics: request.fabrics.map((fabric) =>
      fabric.buyYards === undefined ? fabric : { ...fabric, buyYards: lowest(fabric.buyYards) },
    ),
  };
}

function lowest(text: FractionText): FractionText {
  return toText(toFraction(text));
}
