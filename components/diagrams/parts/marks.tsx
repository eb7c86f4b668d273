import { Circle, G, Line, Path, Text } from 'react-native-svg';

import { DARK, HALO, type FabricPaint } from '@/components/diagrams/parts/paints';
import { font } from '@/components/ui/type';
import { pathOf, type Point } from '@/shared/geometry/drawing/points';

/** One piece of cloth. */
export function Piece(props: {
  points: readonly Point[];
  fill: string;
  line: string;
  width?: number;
  opacity?: number;
}) {
  return (
    <Path
      d={pathOf(props.points)}
      fill={props.fill}
      fillOpacity={props.opacity ?? 1}
      stroke={props.line}
      strokeWidth={props.width ?? 1.2}
      strokeLinejoin="round"
    />
  );
}

/** A fabric's letter, upright, with a halo of its cloth. */
export function ClothLetter({
  paint,
  at,
  px = 15,
}: {
  paint: FabricPaint;
  at: Point;
  px?: number;
}) {
  const text = {
    x: at[0],
    y: at[1] + px * 0.36,
    textAnchor: 'middle' as const,
    fontSize: px,
    fontFamily: font.bold,
  };
  return (
    <>
      <Text
        {...text}
        fill={paint.cloth}
        stroke={paint.cloth}
        strokeWidth={px / 2}
        strokeLinejoin="round"
      >
        {paint.letter}
      </Text>
      <Text {...text} fill={paint.ink}>
        {paint.letter}
      </Text>
    </>
  );
}

/** A seam: solid where it is sewn, dashed where it is to sew; light beneath it on dark cloth. */
export function Seam(props: {
  points: readonly Point[];
  color: string;
  sewn?: boolean;
  halo?: boolean;
  closed?: boolean;
  /** for small pictures */
  fine?: boolean;
}) {
  const d = pathOf(props.points, props.closed ?? false);
  const width = props.fine ? 1.6 : 2.5;
  const dash = props.sewn ? {} : { strokeDasharray: props.fine ? '4 2.5' : '6 4' };
  return (
    <>
      {props.halo && <Path d={d} fill="none" stroke={HALO} strokeWidth={width * 2} />}
      <Path d={d} fill="none" stroke={props.color} strokeWidth={width} {...dash} />
    </>
  );
}

/** Where the blade runs: madder dots, with light beneath them on dark cloth. */
export function CutLine(props: {
  points: readonly Point[];
  color: string;
  halo?: boolean;
  closed?: boolean;
}) {
  const d = pathOf(props.points, props.closed ?? false);
  const line = { fill: 'none', strokeLinecap: 'round' as const, strokeDasharray: '1 6' };
  return (
    <>
      {props.halo && <Path d={d} {...line} stroke={HALO} strokeWidth={6} />}
      <Path d={d} {...line} stroke={props.color} strokeWidth={3} />
    </>
  );
}

/** A later cut: dashed, in the cloth's own ink. */
export function LaterCut({ points, color }: { points: readonly Point[]; color: string }) {
  return (
    <Path
      d={pathOf(points, false)}
      fill="none"
      stroke={color}
      strokeWidth={1.4}
      strokeDasharray="5 4"
    />
  );
}

/** A number in a circle, or a check where the piece is done; `next` is filled. */
export function Badge(props: {
  at: Point;
  text: string;
  state: 'done' | 'next' | 'later';
  radius?: number;
}) {
  const { at, state } = props;
  const r = props.radius ?? 13;
  const filled = state !== 'later';
  const ink = filled ? HALO : DARK;
  return (
    <G x={at[0]} y={at[1]}>
      <Circle r={r} fill={filled ? DARK : HALO} stroke={filled ? HALO : DARK} strokeWidth={1.5} />
      {state === 'done' ? (
        <Path
          d="M-5 0l4 4 7-8"
          scale={r / 13}
          fill="none"
          stroke={ink}
          strokeWidth={2.5}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ) : (
        <Text y={r * 0.46} textAnchor="middle" fontSize={r * 1.3} fontFamily={font.bold} fill={ink}>
          {props.text}
        </Text>
      )}
    </G>
  );
}

/** Cut away from you. */
export function AwayArrow({ at, color }: { at: Point; color: string }) {
  return (
    <G x={at[0]} y={at[1]}>
      <Circle r={9.5} fill={HALO} stroke={color} strokeWidth={2.5} />
      <Path
        d="M0 5V-4M-4 -1l4-4 4 4"
        stroke={color}
        strokeWidth={2.4}
        fill="none"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </G>
  );
}

/** A straight arrow from one point to another. */
export function Arrow({ from, to, color }: { from: Point; to: Point; color: string }) {
  const angle = (Math.atan2(to[1] - from[1], to[0] - from[0]) * 180) / Math.PI;
  const line = {
    stroke: color,
    strokeWidth: 2.3,
    fill: 'none',
    strokeLinecap: 'round' as const,
    strokeLinejoin: 'round' as const,
  };
  return (
    <>
      <Line x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} {...line} />
      <G x={to[0]} y={to[1]}>
        <Path d="M-8-7 0 0l-8 7" rotation={angle} {...line} />
      </G>
    </>
  );
}
