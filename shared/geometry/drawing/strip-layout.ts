import type { Box, Point } from './points';
import { windowStart } from './tumbling';

export type CutState = 'done' | 'next' | 'later';

export interface CutPart {
  box: Box;
  /** the cut that frees it, from the maker's side away from her */
  cut: [Point, Point];
  index: number;
  state: CutState;
}

export interface StripLayout {
  scale: number;
  cloth: Box;
  /** what shows of it */
  clip: Box;
  parts: CutPart[];
}

/**
 * Parts cut one after the other off a piece of cloth that lies across the mat: strips off the
 * cloth, lengths off a strip, squares off a strip. Inches in, pixels out; mirrored for a left hand.
 */
export function layOutCuts(cuts: {
  /** the piece of cloth, and each part's share of its width */
  clothIn: number;
  partIn: number;
  heightPx: number;
  startIn: number;
  count: number;
  done: number;
  scale: number;
  room: Box;
  leftHanded: boolean;
}): StripLayout {
  const { clothIn, partIn, startIn, done, scale, room } = cuts;
  const next = startIn + (Math.min(done, Math.max(0, cuts.count - 1)) + 0.5) * partIn;
  const shift = windowStart(clothIn * scale, room.width, next * scale);
  const bottom = room.y + cuts.heightPx;
  const flip = (x: number, width: number) =>
    cuts.leftHanded ? 2 * room.x + room.width - x - width : x;
  const place = (atIn: number, wideIn: number): Box => ({
    x: flip(room.x - shift + atIn * scale, wideIn * scale),
    y: room.y,
    width: wideIn * scale,
    height: cuts.heightPx,
  });
  const parts = Array.from({ length: cuts.count }, (_, index): CutPart => {
    const box = place(startIn + index * partIn, partIn);
    const edge = cuts.leftHanded ? box.x : box.x + box.width;
    return {
      box,
      cut: [
        [edge, bottom],
        [edge, room.y],
      ],
      index,
      state: index < done ? 'done' : index === done ? 'next' : 'later',
    };
  });
  return {
    scale,
    cloth: place(0, clothIn),
    clip: { ...room, width: Math.min(room.width, clothIn * scale), height: cuts.heightPx },
    parts,
  };
}

/** The corners of a box, clockwise from the top left. */
export const cornersOf = ({ x, y, width, height }: Box): Point[] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
];

/**
 * Which part of a repeated job is at hand: with `each` to a strip, where this one starts, taps done
 * on it and how many it has. A full lane shows its last strip, all done.
 */
export function batchAt(
  done: number,
  target: number,
  each: number,
): { start: number; done: number; count: number } {
  const size = Math.max(1, each);
  const full = target > 0 && done >= target;
  const start = full ? Math.floor((target - 1) / size) * size : done - (done % size);
  const count = Math.max(1, Math.min(size, target - start));
  return { start, done: full ? count : done - start, count };
}
