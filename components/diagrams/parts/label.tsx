import { Path, Text } from 'react-native-svg';

import { FractionSpans } from '@/components/diagrams/parts/fraction-spans';
import { font } from '@/components/ui/type';
import { pathOf, type Point } from '@/shared/geometry/drawing/points';

/** A short label on the diagram's own ground; figures in bold. */
export function Label(props: {
  at: Point;
  text: string;
  color: string;
  anchor?: 'start' | 'middle' | 'end';
  strong?: boolean;
  px?: number;
  /** the ground's colour, drawn beneath the letters where lines run below them */
  halo?: string;
}) {
  const text = {
    x: props.at[0],
    y: props.at[1],
    textAnchor: props.anchor ?? ('start' as const),
    fontSize: props.px ?? 14,
    fontFamily: props.strong ? font.bold : font.strong,
  };
  return (
    <>
      {props.halo && (
        <Text {...text} fill={props.halo} stroke={props.halo} strokeWidth={5}>
          <FractionSpans text={props.text} px={text.fontSize} />
        </Text>
      )}
      <Text {...text} fill={props.color}>
        <FractionSpans text={props.text} px={text.fontSize} />
      </Text>
    </>
  );
}

interface DimensionProps {
  from: Point;
  to: Point;
  text: string;
  color: string;
  halo: string;
}

/** A measured length, level: a line with end ticks and its figure above it. */
export function LevelDimension({ from, to, text, color, halo }: DimensionProps) {
  const y = from[1];
  const lines = [
    pathOf([from, to], false),
    pathOf(
      [
        [from[0], y - 5],
        [from[0], y + 5],
      ],
      false,
    ),
    pathOf(
      [
        [to[0], y - 5],
        [to[0], y + 5],
      ],
      false,
    ),
  ];
  return (
    <>
      <Path d={lines.join('')} stroke={color} strokeWidth={1.5} fill="none" />
      <Label
        at={[(from[0] + to[0]) / 2, y - 7]}
        text={text}
        color={color}
        halo={halo}
        anchor="middle"
        strong
      />
    </>
  );
}

/** A measured length, upright, its figure beside it: before the line, or after it. */
export function UprightDimension({
  from,
  to,
  text,
  color,
  halo,
  after = false,
}: DimensionProps & { after?: boolean }) {
  const x = from[0];
  const lines = [
    pathOf([from, to], false),
    pathOf(
      [
        [x - 5, from[1]],
        [x + 5, from[1]],
      ],
      false,
    ),
    pathOf(
      [
        [x - 5, to[1]],
        [x + 5, to[1]],
      ],
      false,
    ),
  ];
  return (
    <>
      <Path d={lines.join('')} stroke={color} strokeWidth={1.5} fill="none" />
      <Label
        at={[after ? x + 9 : x - 9, (from[1] + to[1]) / 2 + 5]}
        text={text}
        color={color}
        halo={halo}
        anchor={after ? 'start' : 'end'}
        strong
      />
    </>
  );
}
