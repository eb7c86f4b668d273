import type { CutRun } from './cut-run';
import { applyFit, type Fit } from './fit';
import { mirrorPoints, type Box, type Point } from './points';
import { windowStart } from './tumbling';

export interface TumblingLayout {
  fit: Fit;
  /** the whole top layer, and the part of it that shows */
  cloth: Box;
  clip: Box;
  /** how far each layer peeps out below the one above */
  offset: number;
  /** how far they all peep out together */
  reach: number;
  pieces: {
    outline: Point[];
    /** the cut that frees it, from the maker's side away from her */
    cut: [Point, Point];
    middle: Point;
    state: 'done' | 'next' | 'later';
  }[];
  badgeRadius: number;
  /** where the section of the layers stands */
  rows: Box;
  /** whether there is room to measure */
  roomy: boolean;
}

const LEAST_HEIGHT_PX = 70;
const LEAST_PITCH_PX = 30;
const ROOMY_PX = 330;
const ROWS_WIDTH = 72;
const EDGE = 16;

/** Lays a stack out under the ruler. A long one shows the part that is being cut. */
export function layOutTumbling(run: CutRun, box: Box, leftHanded: boolean): TumblingLayout {
  const roomy = box.height >= ROOMY_PX;
  const offset = Math.min(roomy ? 5 : 2.5, 16 / Math.max(1, run.layers.length));
  const room = clothRoom(box, roomy);
  const scale = scaleOf(run, room);
  const clip = {
    x: room.x,
    y: room.y + Math.max(0, (room.height - run.heightIn * scale) / 2),
    width: Math.min(room.width, run.lengthIn * scale),
    height: run.heightIn * scale,
  };
  const next = run.pieces[Math.min(run.done, run.pieces.length - 1)];
  const shift = windowStart(run.lengthIn * scale, clip.width, (next?.middleX ?? 0) * scale);
  const fit = { scale, dx: clip.x - shift, dy: clip.y };
  const middle = clip.x + clip.width / 2;
  const turn = (points: readonly Point[]) =>
    leftHanded ? mirrorPoints(applyFit(fit, points), middle) : applyFit(fit, points);
  const pitchPx = pitchOf(run) * scale;
  return {
    fit: leftHanded ? { ...fit, dx: 2 * middle - fit.dx } : fit,
    cloth: {
      x: leftHanded ? 2 * middle - fit.dx - run.lengthIn * scale : fit.dx,
      y: clip.y,
      width: run.lengthIn * scale,
      height: clip.height,
    },
    clip,
    offset,
    reach: offset * run.layers.length,
    pieces: run.pieces.map((piece, index) => ({
      outline: turn(piece.outline),
      cut: pairOf(turn(piece.cut)),
      middle: turn([[piece.middleX, run.heightIn / 2]])[0] ?? [0, 0],
      state: index < run.done ? 'done' : index === run.done ? 'next' : 'later',
    })),
    badgeRadius: Math.max(7, Math.min(13, pitchPx * 0.36)),
    rows: rowsBox(box, roomy),
    roomy,
  };
}

const pairOf = (points: Point[]): [Point, Point] => [points[0] ?? [0, 0], points[1] ?? [0, 0]];

function clothRoom(box: Box, roomy: boolean): Box {
  const left = roomy ? 58 : 18;
  const right = roomy ? 40 : ROWS_WIDTH + EDGE + 34;
  const top = roomy ? 56 : Math.min(19, box.height * 0.12);
  const bottom = roomy ? 186 : Math.min(28, box.height * 0.18);
  return {
    x: box.x + left,
    y: box.y + top,
    width: Math.max(60, box.width - left - right),
    height: Math.max(20, box.height - top - bottom),
  };
}

/** Beside the cloth, or below it where there is room to measure. */
function rowsBox(box: Box, roomy: boolean): Box {
  const height = roomy ? 104 : Math.max(20, box.height - 2 * EDGE);
  const width = roomy ? 104 : ROWS_WIDTH;
  return {
    x: box.x + box.width - width - EDGE,
    y: box.y + (roomy ? box.height - height - EDGE : EDGE),
    width,
    height,
  };
}

function pitchOf(run: CutRun): number {
  const [first, second] = run.pieces;
  if (!first || !second) return run.lengthIn;
  return second.middleX - first.middleX;
}

function scaleOf(run: CutRun, room: Box): number {
  const tall = room.height / run.heightIn;
  const whole = Math.min(tall, room.width / run.lengthIn);
  const readable = Math.max(LEAST_HEIGHT_PX / run.heightIn, LEAST_PITCH_PX / pitchOf(run));
  return Math.max(whole, Math.min(tall, readable));
}
