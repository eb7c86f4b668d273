import { tipFlap } from '../geometry/tip-flap';
import type { PlanStack, PlanWarning } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { dominantOnDiagonals } from '../patterns/ring/fabric-order';
import type { RingCutting } from '../patterns/ring/ring-cutting';
import type { RingGeometry } from '../patterns/ring/ring-geometry';
import { toText } from '../units/fraction';
import { keepNineDecimals } from '../units/keep-nine-decimals';

/** Warns when stacks are deeper than the blade's cap, which only layers of her own can make them. */
export function warnOfCap({ cutting }: PlanRequest, stacks: readonly PlanStack[]): PlanWarning[] {
  const layers = Math.max(...stacks.map(({ perCut }) => perCut));
  if (layers <= cutting.cap) return [];
  return [{ code: 'capExceeded', params: { layers, cap: cutting.cap } }];
}

/** Says what the order of fabrics around the ring could not keep. */
export function warnOfOrder({ order, letters }: RingCutting): PlanWarning[] {
  const [first = '', second = ''] = order;
  const wedges = letters.length;
  if (order.length === 1) return [{ code: 'oneFabric', params: { fabric: first } }];
  if (wedges % order.length !== 1) return [];
  if (order.length === 2) {
    return [{ code: 'neighboursClash', params: { fabric: first, wedges } }];
  }
  return [{ code: 'lastWedgeChanged', params: { fabric: second, instead: first } }];
}

/** Names the fabrics that a plate takes more of, and the wedges that are cut and left over. */
export function warnOfExtras({ blocks }: PlanRequest, cutting: RingCutting): PlanWarning[] {
  const { order, letters, groups } = cutting;
  const takes = (letter: string) => letters.filter((other) => other === letter).length;
  const fewest = Math.min(...order.map(takes));
  const more = order.filter((letter) => takes(letter) > fewest);
  if (more.length === 0) return [];
  const left = groups.flatMap(({ fabrics, cutsPerPlate }) =>
    fabrics.flatMap(({ letter }) => (takes(letter) < cutsPerPlate ? [letter] : [])),
  );
  const params = { fabrics: more.join('+'), count: 1, left: left.join('+'), leftEach: blocks };
  return [{ code: 'extraWedges', params: left.length > 0 ? params : { ...params, leftEach: 0 } }];
}

/** Warns when the dominant fabric does not come to lie on the diagonals. */
export function warnOfDiagonals({ fabrics, wedges }: PlanRequest): PlanWarning[] {
  const used = fabrics.filter(({ role }) => role === 'wedge');
  const dominant = used.find((fabric) => fabric.dominant);
  if (!dominant || used.length === 1 || dominantOnDiagonals(used.length, wedges)) return [];
  return [
    {
      code: 'dominantOffDiagonals',
      params: { fabric: dominant.letter, axes: wedges % 8 === 4 ? 4 : 0 },
    },
  ];
}

/** Warns of halves without quarters, a flap that shows in the hole, and a margin under a seam. */
export function warnOfShape(request: PlanRequest, geometry: RingGeometry): PlanWarning[] {
  const { reach, wedges, seam, narrowAt, margin } = geometry;
  const warnings: PlanWarning[] = [];
  if (wedges % 4 !== 0) warnings.push({ code: 'noQuarters', params: { wedges } });
  const flapIn = tipFlap(reach.valueOf(), wedges, seam.valueOf());
  if (request.tip.shape === 'pointed' && flapIn < narrowAt.valueOf()) {
    const params = { reaches: keepNineDecimals(flapIn), hole: toText(narrowAt) };
    warnings.push({ code: 'flapBelowHole', params });
  }
  if (margin.valueOf() < seam.valueOf()) {
    const shown = typeof margin === 'number' ? keepNineDecimals(margin) : toText(margin);
    warnings.push({ code: 'smallMargin', params: { margin: shown } });
  }
  return warnings;
}
