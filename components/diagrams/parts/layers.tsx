import { Rect } from 'react-native-svg';

import { ClothLetter } from '@/components/diagrams/parts/marks';
import type { Paints } from '@/components/diagrams/parts/paints';
import type { Box } from '@/shared/geometry/drawing/points';
import { stackRows } from '@/shared/geometry/drawing/stack-rows';

/** The section of a stack: a row for each layer, its letter on it, the top one first. */
export function LayerRows({
  letters,
  box,
  paints,
}: {
  letters: readonly string[];
  box: Box;
  paints: Paints;
}) {
  return stackRows(letters.length, box).map((row, index) => {
    const paint = paints.of(letters[index] ?? '');
    const px = Math.min(15, row.height * 0.72);
    return [
      <Rect
        key={index}
        x={row.x}
        y={row.y}
        width={row.width}
        height={row.height}
        rx={3}
        fill={paint.right}
        stroke={paints.outline}
        strokeWidth={1}
      />,
      <ClothLetter
        key={`letter-${index}`}
        paint={paint}
        at={[row.x + row.width / 2, row.y + row.height / 2]}
        px={px}
      />,
    ];
  });
}

/** A stack from above: the top layer whole, the others peeping out below and to the right. */
export function LayersFromAbove({
  letters,
  box,
  offset,
  paints,
}: {
  letters: readonly string[];
  box: Box;
  offset: number;
  paints: Paints;
}) {
  return letters
    .map((letter, index) => (
      <Rect
        key={index}
        x={box.x + index * offset}
        y={box.y + index * offset}
        width={box.width}
        height={box.height}
        fill={paints.of(letter).right}
        stroke={paints.outline}
        strokeWidth={1}
      />
    ))
    .reverse();
}
