import { Path } from 'react-native-svg';

import type { Paints } from '@/components/diagrams/parts/paints';
import type { Fit } from '@/shared/geometry/drawing/fit';
import { gridLines } from '@/shared/geometry/drawing/grid-lines';
import { pathOf, type Box } from '@/shared/geometry/drawing/points';

/** The mat beneath a diagram: one square is one inch at the diagram's own scale. */
export function Grid({ box, fit, paints }: { box: Box; fit: Fit; paints: Paints }) {
  const lines = gridLines(box, fit).map((line) => pathOf(line, false));
  return <Path d={lines.join('')} stroke={paints.theme.grid.major} fill="none" />;
}
