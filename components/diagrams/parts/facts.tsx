import { Label } from '@/components/diagrams/parts/label';
import type { Paints } from '@/components/diagrams/parts/paints';
import type { Point } from '@/shared/geometry/drawing/points';

/** Short lines of words beside a drawing; the first in bold. */
export function Facts({ lines, at, paints }: { lines: string[]; at: Point; paints: Paints }) {
  const { ink, ink2 } = paints.theme.color;
  return lines.map((line, index) => (
    <Label
      key={line}
      at={[at[0], at[1] + index * 20]}
      text={line}
      color={index === 0 ? ink : ink2}
      strong={index === 0}
      px={index === 0 ? 15.5 : 14}
    />
  ));
}
