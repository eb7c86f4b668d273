/** [x, y] in inches. For a wedge: x along its axis from the plate's centre, y across. */
export type Point = readonly [number, number];
