import type { Box } from './points';
import type { RingShape } from './ring-shape';
import { rawHalf } from './wedge-outlines';

/**
 * The part of a wedge to show for its tip, the axis upright and the plate's centre at the origin:
 * its whole width, and as much of its length, the flap of a pointed tip included.
 */
export function tipView(shape: RingShape): Box {
  const half = rawHalf(shape, shape.shoulderIn);
  const flapIn = rawHalf(shape, shape.reachIn);
  const shown = Math.min(shape.reachIn - shape.narrowIn, Math.max(2 * half, flapIn * 1.5));
  return { x: -half, y: -shape.reachIn, width: 2 * half, height: shown };
}
