import { type Fraction } from 'fraction.js';

import { squareStrips } from '../../cutting/square-strips';
import type { PlanStrip } from '../../model/plan';
import type { PlanRequest, RequestFabric } from '../../model/plan-request';
import { toText } from '../../units/fraction';
import type { RingCutting } from './ring-cutting';
import type { RingGeometry } from './ring-geometry';

/** Every strip cut from one fabric of a ring plan: for wedges, circles and backgrounds. */
export function ringStrips(
  fabric: RequestFabric,
  request: PlanRequest,
  geometry: RingGeometry,
  cutting: RingCutting,
  usableWidth: Fraction,
): PlanStrip[] {
  const { blocks, centre, background } = request;
  const strips: PlanStrip[] = [];
  const group = cutting.groups.find(({ fabrics }) => fabrics.includes(fabric));
  if (group) {
    strips.push({
      height: toText(geometry.stripHeight),
      count: group.cut.strips,
      for: 'wedge',
      lengths: group.cut.lengths,
      length: toText(group.cut.length),
      each: group.cut.each,
    });
  }
  if (geometry.circle && centre.shape === 'circle' && centre.fabric === fabric.letter) {
    strips.push(squareStrips('circle', geometry.circle.square, blocks, usableWidth));
  }
  if (background.fabric === fabric.letter) {
    strips.push(squareStrips('background', geometry.background.cut, blocks, usableWidth));
  }
  return strips;
}
