import { Path } from 'react-native-svg';

import { AwayArrow, CutLine } from '@/components/diagrams/parts/marks';
import type { Paints } from '@/components/diagrams/parts/paints';
import { pathOf, type Point } from '@/shared/geometry/drawing/points';
import { rulerAlong } from '@/shared/geometry/drawing/ruler';

interface Props {
  paints: Paints;
  /** from the maker's side away from her, pixels */
  cut: readonly [Point, Point];
  scale: number;
  width: number;
  side: 1 | -1;
  halo: boolean;
  overhang?: number;
}

/** The ruler on the piece to keep, the dotted cut along its edge, the arrow away from you. */
export function RulerAndCut({ paints, cut, scale, width, side, halo, overhang = 10 }: Props) {
  const { ruler, rulerEdge, rulerOpacity } = paints.theme.diagram;
  const { outline, ticks } = rulerAlong(cut, scale, width, side, overhang);
  return (
    <>
      <Path
        d={pathOf(outline)}
        fill={ruler}
        fillOpacity={rulerOpacity}
        stroke={rulerEdge}
        strokeWidth={1.5}
        strokeLinejoin="round"
      />
      <Path d={ticks.map((tick) => pathOf(tick, false)).join('')} stroke={rulerEdge} />
      <CutLine points={cut} color={paints.cut} halo={halo} />
      <AwayArrow at={cut[0]} color={paints.cut} />
    </>
  );
}
