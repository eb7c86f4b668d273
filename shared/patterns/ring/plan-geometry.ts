import { wedgePitch } from '../../cutting/wedge-pitch';
import { stripRun } from '../../cutting/strip-run';
import { wedgesPerStrip } from '../../cutting/wedges-per-strip';
import { marginOnFolds } from '../../geometry/margin-on-folds';
import { wedgeOutline } from '../../geometry/wedge-outline';
import type { TemplateLength } from '../../model/length';
import type { PlanGeometry } from '../../model/plan';
import type { PlanRequest } from '../../model/plan-request';
import { toFraction, toText } from '../../units/fraction';
import { keepNineDecimals } from '../../units/keep-nine-decimals';
import type { RingGeometry } from './ring-geometry';

/** The geometry as a plan keeps it: exact fractions, and 9 decimals where a length is irrational. */
export function planGeometry(
  request: PlanRequest,
  geometry: RingGeometry,
  order: string[],
): PlanGeometry {
  const { circle, background } = geometry;
  return {
    wedge: wedgePart(request, geometry),
    ring: ringPart(request, geometry, order),
    circle: circle && {
      finishedRadius: template(circle.finishedRadiusIn),
      cutDiameter: {
        exact: keepNineDecimals(circle.cutDiameterIn),
        cut: toText(circle.cut),
        policy: 'upToEighth',
      },
      square: toText(circle.square),
    },
    background: { cut: toText(background.cut), trim: toText(background.trim) },
  };
}

function wedgePart(request: PlanRequest, geometry: RingGeometry): PlanGeometry['wedge'] {
  const { narrowAt, stripHeight, cutNarrowIn, cutWideIn, wedges, seam } = geometry;
  const rawWideAt = narrowAt.add(stripHeight);
  const usableIn = toFraction(request.cloth.usableWidth).valueOf();
  const pitchIn = wedgePitch(cutNarrowIn, cutWideIn, false);
  const perStrip = wedgesPerStrip(usableIn, cutWideIn, pitchIn);
  const corners = wedgeOutline(narrowAt.valueOf(), rawWideAt.valueOf(), wedges, seam.valueOf());
  return {
    rawNarrowAt: toText(narrowAt),
    rawWideAt: toText(rawWideAt),
    stripHeight: toText(stripHeight),
    cutNarrow: template(cutNarrowIn),
    cutWide: template(cutWideIn),
    pitch: template(pitchIn),
    perStrip,
    stripLeft: template(usableIn - stripRun(perStrip, cutWideIn, pitchIn)),
    outline: corners.map(([x, y]) => [keepNineDecimals(x), keepNineDecimals(y)]),
  };
}

function ringPart(
  request: PlanRequest,
  geometry: RingGeometry,
  order: string[],
): PlanGeometry['ring'] {
  const { margin, reach, shoulder, wedges } = geometry;
  const flat = request.tip.shape === 'flat';
  const blockIn = toFraction(request.block).valueOf();
  const onFoldsIn =
    typeof margin === 'number' ? margin : marginOnFolds(blockIn, reach.valueOf(), wedges);
  return {
    reach: toText(reach),
    margin: typeof margin === 'number' ? template(margin) : toText(margin),
    marginSeamsOnFolds: wedges % 4 === 0 ? template(onFoldsIn) : null,
    shoulderAt: flat ? null : template(shoulder.atIn),
    shoulderRadius: flat ? null : template(shoulder.radiusIn),
    holeCorner: template(geometry.holeCornerIn),
    order,
  };
}

function template(exactIn: number): TemplateLength {
  return { exact: keepNineDecimals(exactIn), policy: 'template' };
}
