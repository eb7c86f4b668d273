import { applyFit, type Fit } from './fit';
import { boundsOf, movePoints, type Box, type Point } from './points';
import type { RingShape } from './ring-shape';
import { levelWedge, preparedWedge, rawShoulder } from './wedge-outlines';

export interface ChainPair {
  top: Point[];
  bottom: Point[];
  /** the seam from its narrow end to its wide end, pixels */
  seam: [Point, Point];
  /** x up to which the seam is still to sew, from the narrow end */
  sewnFrom: number;
  letterAt: Point;
}

export interface ChainLayout {
  fit: Fit;
  pairs: ChainPair[];
  needle: Point;
  /** the thread between each pair and the one sewn before it */
  threads: [Point, Point][];
}

const PEEP: Point = [7, -6]; // the lower wedge shows behind the upper one, pixels
const GAP_IN = 0.65;
const MOST_SCALE = 64; // pixels an inch
const NEEDLE_AT = 0.42; // of the seam, from its narrow end

/**
 * Pairs right sides together in a chain, the seam level below, wide end first under the needle:
 * those to the right are sewn, those to the left still to sew.
 */
export function layOutChain(shape: RingShape, box: Box): ChainLayout {
  const inches = levelWedge(shape);
  const size = boundsOf(inches);
  const scale = Math.min(
    (box.height * 0.5) / size.height,
    box.width / (2.3 * (size.width + GAP_IN)),
    MOST_SCALE,
  );
  const bottom = box.y + box.height * (box.height < 130 ? 0.86 : 0.72);
  const period = (size.width + GAP_IN) * scale;
  const home = box.x + box.width * 0.22;
  const fitAt = (x: number): Fit => ({
    scale,
    dx: x - size.x * scale,
    dy: bottom - (size.y + size.height) * scale,
  });
  const from = -Math.ceil((home - box.x) / period);
  const to = Math.ceil((box.x + box.width - home) / period);
  const pairs: ChainPair[] = [];
  for (let i = from; i <= to; i += 1)
    pairs.push(drawPair(shape, inches, fitAt(home + i * period), i));
  const first = pairs[-from];
  const threads = pairs.slice(-from).flatMap((pair, index, all): [Point, Point][] => {
    const before = all[index + 1];
    return before ? [[pair.seam[1], before.seam[0]]] : [];
  });
  return {
    fit: fitAt(home),
    pairs,
    needle: first ? [first.sewnFrom, first.seam[0][1]] : [home, bottom],
    threads,
  };
}

function drawPair(shape: RingShape, inches: Point[], fit: Fit, index: number): ChainPair {
  const cos = Math.cos(shape.halfAngleRad);
  const wide = shape.tip === 'pointed' ? rawShoulder(shape) : shape.shoulderIn;
  const seam = applyFit(fit, [
    [shape.narrowIn / cos, 0],
    [wide / cos, 0],
  ]);
  const start = seam[0] ?? [0, 0];
  const end = seam[1] ?? [0, 0];
  const under = start[0] + (end[0] - start[0]) * NEEDLE_AT;
  const top = applyFit(fit, inches);
  const half = boundsOf(preparedWedge(shape)).height / 2;
  const [letterAt] = applyFit(fit, [[wide / cos - half * 0.5, -half * 0.62]]);
  return {
    top,
    bottom: movePoints(top, ...PEEP),
    seam: [start, end],
    sewnFrom: index < 0 ? end[0] : index > 0 ? start[0] : under,
    letterAt: letterAt ?? start,
  };
}
