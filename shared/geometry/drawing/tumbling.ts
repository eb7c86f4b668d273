import type { Point } from './points';

export interface TumblingPiece {
  /** clockwise from the top left corner; the strip's top edge is y = 0 */
  outline: [Point, Point, Point, Point];
  /** the cut that frees the piece, at its right: from the strip's bottom to its top */
  cut: [Point, Point];
  middleX: number;
}

/**
 * Where wedges lie along a length, every other one turned (a one-way print is never turned).
 * k wedges need c_w + (k − 1)·pitch, pitch = (c_n + c_w)/2; one-way: k·c_w. Lengths in inches.
 */
export function tumblingPieces(wedge: {
  narrowIn: number;
  wideIn: number;
  heightIn: number;
  count: number;
  startIn: number;
  oneWay: boolean;
}): TumblingPiece[] {
  const { narrowIn, wideIn, heightIn, startIn, oneWay } = wedge;
  const pitch = oneWay ? wideIn : (narrowIn + wideIn) / 2;
  return Array.from({ length: wedge.count }, (_, i) => {
    const turned = !oneWay && i % 2 === 1;
    const middleX = startIn + wideIn / 2 + i * pitch;
    const top = (turned ? wideIn : narrowIn) / 2;
    const bottom = (turned ? narrowIn : wideIn) / 2;
    const cut: [Point, Point] = [
      [middleX + bottom, heightIn],
      [middleX + top, 0],
    ];
    return {
      outline: [[middleX - top, 0], cut[1], cut[0], [middleX - bottom, heightIn]],
      cut,
      middleX,
    };
  });
}

/** What a run of pieces takes of a length, inches. */
export const tumblingRun = (pieces: readonly TumblingPiece[]): number => {
  const xs = pieces.flatMap((piece) => piece.outline.map(([x]) => x));
  return xs.length === 0 ? 0 : Math.max(...xs) - Math.min(...xs);
};

/**
 * The part of a long thing that shows: how far it is moved to the left so that `focus` is in
 * view, never past an end. All in the same unit.
 */
export function windowStart(lengthAll: number, lengthShown: number, focus: number): number {
  if (lengthAll <= lengthShown) return 0;
  return Math.min(lengthAll - lengthShown, Math.max(0, focus - lengthShown / 2));
}
