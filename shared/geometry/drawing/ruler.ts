import type { Point } from './points';

export interface RulerDrawing {
  outline: Point[];
  /** quarter-inch ticks along the cutting edge: inch, half and quarter ones differ in length */
  ticks: [Point, Point][];
}

/**
 * A ruler whose edge lies on a cut, on the side of the piece that is kept. Pixels; `cut` runs
 * away from the maker. `side` −1: the ruler lies to the left of the cut, 1: to the right.
 */
export function rulerAlong(
  cut: readonly [Point, Point],
  pixelsPerInch: number,
  widthPx: number,
  side: 1 | -1,
  overhangPx = 10,
): RulerDrawing {
  const [near, far] = cut;
  const length = Math.max(1, Math.hypot(far[0] - near[0], far[1] - near[1]));
  const along: Point = [(far[0] - near[0]) / length, (far[1] - near[1]) / length];
  const across: Point = [-along[1] * side, along[0] * side];
  const at = (forward: number, out: number): Point => [
    near[0] + along[0] * forward + across[0] * out,
    near[1] + along[1] * forward + across[1] * out,
  ];
  const end = length + overhangPx;
  const quarter = pixelsPerInch / 4;
  // on small scales quarter ticks would run together
  const every = quarter >= 4 ? 1 : quarter >= 2 ? 2 : 4;
  const ticks: [Point, Point][] = [];
  for (let i = every; i * quarter < end; i += every) {
    const reach = i % 4 === 0 ? 11 : i % 2 === 0 ? 7 : 4;
    ticks.push([at(end - i * quarter, 0), at(end - i * quarter, Math.min(reach, widthPx / 2))]);
  }
  return {
    outline: [at(-overhangPx, 0), at(end, 0), at(end, widthPx), at(-overhangPx, widthPx)],
    ticks,
  };
}
