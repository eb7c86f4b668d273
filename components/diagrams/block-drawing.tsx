import { View } from 'react-native';
import Svg, { Circle, G, Line, Rect } from 'react-native-svg';

import { ClothLetter, Piece } from '@/components/diagrams/parts/marks';
import { type Paints, PaintDefs, usePaints } from '@/components/diagrams/parts/paints';
import type { Fit } from '@/shared/geometry/drawing/fit';
import { drawRing, ringExtent, ringLetterPx } from '@/shared/geometry/drawing/ring-drawing';
import { ringShape, type RingShape } from '@/shared/geometry/drawing/ring-shape';
import { toInches } from '@/shared/geometry/drawing/to-inches';
import type { Plan } from '@/shared/model/plan';

const LEAST_LETTER_PX = 8.5;

interface Props {
  plan: Plan;
  size: number;
  letters?: boolean;
  /** for a dark zone: light outlines */
  onDark?: boolean;
  backgroundless?: boolean;
}

/** The finished block in true proportion: background, fold lines, ring and centre. */
export function BlockDrawing({
  plan,
  size,
  letters = true,
  onDark = false,
  backgroundless = false,
}: Props) {
  const own = usePaints(plan.request.fabrics);
  const paints = onDark ? { ...own, outline: '#E9DCC6' } : own;
  const shape = ringShape(plan);
  const widthIn = backgroundless ? 2 * ringExtent(shape) : toInches(plan.request.block);
  const fit: Fit = { scale: (size - 2) / widthIn, dx: size / 2, dy: size / 2 };
  return (
    <View
      accessible
      role="img"
      aria-label={describeBlock(plan)}
      style={{ width: size, height: size }}
    >
      <Svg width={size} height={size}>
        <PaintDefs paints={paints} scale={Math.min(1, Math.max(0.6, size / 260))} />
        {!backgroundless && <Background plan={plan} paints={paints} size={size} />}
        <RingDrawing plan={plan} shape={shape} paints={paints} fit={fit} letters={letters} />
      </Svg>
    </View>
  );
}

/** One sentence for the whole block. */
export function describeBlock(plan: Plan): string {
  const { ring, circle } = plan.geometry;
  const centre = circle ? 'A circle covers the centre.' : 'The centre is open.';
  return `${plan.request.wedges} wedges in a ring, clockwise ${ring.order.join(', ')}. ${centre}`;
}

function Background({ plan, paints, size }: { plan: Plan; paints: Paints; size: number }) {
  const paint = paints.of(plan.request.background.fabric);
  const fold = { stroke: paint.ink, strokeOpacity: 0.6, strokeDasharray: '4 4' };
  const middle = size / 2;
  return (
    <>
      <Rect
        x={0.5}
        y={0.5}
        width={size - 1}
        height={size - 1}
        fill={paint.right}
        stroke={paints.theme.color.edge}
      />
      <Line x1={middle} y1={0} x2={middle} y2={size} {...fold} />
      <Line x1={0} y1={middle} x2={size} y2={middle} {...fold} />
    </>
  );
}

interface RingProps {
  plan: Plan;
  shape: RingShape;
  paints: Paints;
  /** its origin is the plate's centre */
  fit: Fit;
  letters: boolean;
  /** false: the ring alone, its hole still open */
  centre?: boolean;
}

/** A ring of finished wedges with its centre circle, inside an `Svg` with `PaintDefs`. */
export function RingDrawing({ plan, shape, paints, fit, letters, centre = true }: RingProps) {
  const px = ringLetterPx(shape, fit.scale);
  const wedges = drawRing(plan, shape, fit);
  const line = Math.min(1.2, Math.max(0.7, fit.scale / 14));
  const { centre: choice } = plan.request;
  return (
    <G>
      {wedges.map(({ letter, points }, index) => (
        <Piece
          key={index}
          points={points}
          fill={paints.of(letter).right}
          line={paints.outline}
          width={line}
        />
      ))}
      {letters &&
        px >= LEAST_LETTER_PX &&
        wedges.map(({ letter, letterAt }, index) => (
          <ClothLetter key={index} paint={paints.of(letter)} at={letterAt} px={px} />
        ))}
      {centre && shape.circleIn !== null && choice.shape === 'circle' && (
        <CentreCircle
          paints={paints}
          letter={choice.fabric}
          fit={fit}
          radius={shape.circleIn * fit.scale}
          letterPx={letters ? Math.min(17, shape.circleIn * fit.scale * 0.8) : 0}
          line={line}
        />
      )}
    </G>
  );
}

function CentreCircle(props: {
  paints: Paints;
  letter: string;
  fit: Fit;
  radius: number;
  letterPx: number;
  line: number;
}) {
  const { fit } = props;
  const paint = props.paints.of(props.letter);
  return (
    <>
      <Circle
        cx={fit.dx}
        cy={fit.dy}
        r={props.radius}
        fill={paint.right}
        stroke={props.paints.outline}
        strokeWidth={props.line}
      />
      {props.letterPx >= LEAST_LETTER_PX && (
        <ClothLetter paint={paint} at={[fit.dx, fit.dy]} px={props.letterPx} />
      )}
    </>
  );
}
