import { boundsOf, turnPoints, type Box, type Point } from './points';
import type { RingShape } from './ring-shape';
import { preparedWedge, seamAllowance } from './wedge-outlines';

export interface PressView {
  /** from the back, the seam upright on x = 0, tips up, the plate's centre at the origin */
  left: Point[];
  right: Point[];
  /** what lies on top of the left and of the right wedge: the allowances folded over */
  overLeft: Point[];
  overRight: Point[];
  seam: [Point, Point];
  /** what to show: the outer part of the two */
  view: Box;
}

/** Two neighbours of a ring from the back, joined, with both allowances as they fold. Inches. */
export function pressView(shape: RingShape): PressView {
  const theta = shape.halfAngleRad;
  const upright = (points: Point[], angle: number) => turnPoints(points, angle - Math.PI / 2);
  const right = upright(preparedWedge(shape, false, true), theta);
  const left = upright(preparedWedge(shape, true, false), -theta);
  // an allowance folds over at the seam: it is mirrored there
  const overRight = upright(seamAllowance(shape, 1), -theta);
  const overLeft = upright(seamAllowance(shape, -1), theta);
  const cos = Math.cos(theta);
  const bounds = boundsOf([...left, ...right]);
  const shown = Math.min(bounds.height, bounds.width * 1.05);
  return {
    left,
    right,
    overLeft,
    overRight,
    seam: [
      [0, -shape.narrowIn / cos],
      [0, -shape.shoulderIn / cos],
    ],
    view: { ...bounds, height: shown },
  };
}
