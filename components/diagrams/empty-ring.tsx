import { View } from 'react-native';
import Svg, { Circle, Path } from 'react-native-svg';

import { useTheme } from '@/components/ui/theme';
import { applyFit } from '@/shared/geometry/drawing/fit';
import { placeWedge } from '@/shared/geometry/drawing/place-wedge';
import { pathOf } from '@/shared/geometry/drawing/points';
import type { RingShape } from '@/shared/geometry/drawing/ring-shape';
import { finishedWedge } from '@/shared/geometry/drawing/wedge-outlines';

/** The ring of the example plan, not made yet: 16 wedges that reach 7¼ in. */
const RING: RingShape = {
  wedges: 16,
  halfAngleRad: Math.PI / 16,
  seamIn: 0.25,
  tipTurnIn: 0.25,
  narrowIn: 2,
  wideIn: 7.5,
  holeIn: 2.54,
  reachIn: 7.25,
  tip: 'pointed',
  shoulderIn: 7.25 / (1 + Math.tan(Math.PI / 16)),
  circleIn: 2.54,
};

/** A ring in dashes: nothing here yet. */
export function EmptyRing({ size }: { size: number }) {
  const { color } = useTheme();
  const fit = { scale: (size - 4) / (2 * RING.reachIn), dx: size / 2, dy: size / 2 };
  const line = {
    fill: 'none',
    stroke: color.edge,
    strokeWidth: 1.6,
    strokeDasharray: '5 5',
    strokeLinejoin: 'round' as const,
  };
  const wedges = Array.from({ length: RING.wedges }, (_, index) =>
    // the side before each wedge is drawn by its neighbour
    pathOf(applyFit(fit, placeWedge(RING, index, finishedWedge(RING).slice(1, -1))), false),
  );
  const sides = Array.from({ length: RING.wedges }, (_, index) =>
    pathOf(applyFit(fit, placeWedge(RING, index, finishedWedge(RING).slice(-2))), false),
  );
  return (
    <View aria-hidden style={{ width: size, height: size }}>
      <Svg width={size} height={size}>
        <Path d={wedges.join('')} {...line} />
        <Path d={sides.join('')} {...line} strokeOpacity={0.55} />
        <Circle
          cx={fit.dx}
          cy={fit.dy}
          r={RING.circleIn === null ? 0 : RING.circleIn * fit.scale}
          {...line}
        />
      </Svg>
    </View>
  );
}
