import type { Box } from './points';

const LEAST_ROW = 17;
const MOST_ROW = 44;
const GAP = 2;

/** Rows for the layers of a stack, top first; more columns once a letter would not fit. */
export function stackRows(layers: number, box: Box): Box[] {
  const perColumn = Math.max(1, Math.floor((box.height + GAP) / (LEAST_ROW + GAP)));
  const columns = Math.max(1, Math.ceil(layers / perColumn));
  const rows = Math.ceil(layers / columns);
  const width = (box.width - GAP * (columns - 1)) / columns;
  const height = Math.min(MOST_ROW, (box.height - GAP * (rows - 1)) / rows);
  const top = box.y + (box.height - rows * height - GAP * (rows - 1)) / 2;
  return Array.from({ length: layers }, (_, i) => ({
    x: box.x + Math.floor(i / rows) * (width + GAP),
    y: top + (i % rows) * (height + GAP),
    width,
    height,
  }));
}
