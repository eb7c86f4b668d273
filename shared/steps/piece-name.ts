import type { PlanRequest } from '../model/plan-request';
import type { PlanGeometry } from '../model/plan';

/**
 * The cut geometry that a step works on, as its key names it: a step keeps its counts only while
 * this stays the same.
 *
 * @example "wedge 16 2 11/2 1/4"
 */
export function wedgeName(request: PlanRequest): string {
  const { wedges, narrowAt, stripHeight, seam } = request;
  return `wedge ${wedges} ${narrowAt} ${stripHeight} ${seam}`;
}

/** A wedge with its tip. @example "wedge 16 2 11/2 1/4 pointed 1/4" */
export function tippedName(request: PlanRequest): string {
  const { tip } = request;
  const turning = tip.shape === 'pointed' ? tip.seam : tip.turnUnder;
  return `${wedgeName(request)} ${tip.shape} ${turning}`;
}

/** @example "circle 45/8 turned 1/4" */
export function circleName(
  centre: Extract<PlanRequest['centre'], { shape: 'circle' }>,
  circle: NonNullable<PlanGeometry['circle']>,
): string {
  const turning = centre.edge === 'turned' ? ` ${centre.turning}` : '';
  return `circle ${circle.cutDiameter.cut} ${centre.edge}${turning}`;
}
