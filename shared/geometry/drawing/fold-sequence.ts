import type { Box, Point } from './points';

export interface FoldState {
  cloth: Box;
  /** edges that are folds */
  folds: [Point, Point][];
  /** lines to fold along, or creases left */
  creases: [Point, Point][];
  /** opened out, its right side up */
  whole: boolean;
}

const ARROW = 34; // pixels between one state and the next

/** A square folded in quarters: whole, half, quarter, and opened out with its creases. Pixels. */
export function foldSequence(box: Box): {
  states: FoldState[];
  arrows: [Point, Point][];
  side: number;
} {
  // whole + half + quarter + whole = 3 sides across, with three arrows
  const side = Math.max(20, Math.min(box.height - 28, (box.width - 32 - 3 * ARROW) / 3));
  const left = box.x + (box.width - 3 * side - 3 * ARROW) / 2;
  const top = box.y + (box.height - side) / 2;
  const half = side / 2;
  const at = (x: number, y: number, width: number, height: number): Box => ({
    x,
    y,
    width,
    height,
  });
  const second = left + side + ARROW;
  const third = second + half + ARROW;
  const last = third + half + ARROW;
  const states: FoldState[] = [
    {
      cloth: at(left, top, side, side),
      folds: [],
      creases: [upright(left + half, top, side)],
      whole: true,
    },
    {
      cloth: at(second, top, half, side),
      folds: [upright(second, top, side)],
      creases: [level(second, top + half, half)],
      whole: false,
    },
    {
      cloth: at(third, top + half, half, half),
      folds: [upright(third, top + half, half), level(third, top + half, half)],
      creases: [],
      whole: false,
    },
    {
      cloth: at(last, top, side, side),
      folds: [],
      creases: [upright(last + half, top, side), level(last, top + half, side)],
      whole: true,
    },
  ];
  const middle = top + side * 0.75;
  const arrows = [left + side, second + half, third + half].map((x): [Point, Point] => [
    [x + 7, middle],
    [x + ARROW - 7, middle],
  ]);
  return { states, arrows, side };
}

const upright = (x: number, y: number, length: number): [Point, Point] => [
  [x, y],
  [x, y + length],
];
const level = (x: number, y: number, length: number): [Point, Point] => [
  [x, y],
  [x + length, y],
];
