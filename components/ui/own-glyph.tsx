import type { ReactElement } from 'react';
import { Circle, Ellipse, G, Path, Rect, Svg } from 'react-native-svg';

export type OwnGlyphName = 'table' | 'machine' | 'iron' | 'chair' | 'wall' | 'matside';

const strokes = (...paths: string[]) => (
  <>
    {paths.map((d) => (
      <Path key={d} d={d} />
    ))}
  </>
);

const table = (
  <>
    <Circle cx={8} cy={15.5} r={5.5} />
    <Circle cx={8} cy={15.5} r={1} />
    <Path d="m11.6 11.9 7-7.4a1.6 1.6 0 0 1 2.4 2.2l-7 7.6" />
  </>
);
const machine = strokes(
  'M3 20h18',
  'M5 20v-3h11v3',
  'M21 20V7a3 3 0 0 0-3-3H5a1 1 0 0 0-1 1v4a1 1 0 0 0 1 1h3.5a1 1 0 0 0 1-1',
  'M16 17v-5.5a1.5 1.5 0 0 0-1.5-1.5h-5',
  'M6.5 10v4',
);
const iron = strokes(
  'M2.5 18.5h19v-4.2c0-3-2.4-5.3-5.4-5.3H13C7.4 9 3.4 12.5 2.5 18.5Z',
  'M8 5.5h9.5A1.5 1.5 0 0 1 19 7v2.6',
  'M11 14h6',
);
const chair = (
  <>
    <Path d="M3.5 20.5 16 8" />
    <Ellipse cx={17.7} cy={6.3} rx={2.9} ry={1.7} transform="rotate(-45 17.7 6.3)" />
    <Path d="M18.8 5.2c3 1.3 3 5.3-.3 6.5-3 1.1-4.6 1.8-4.2 3.8.5 2.5 4.7 1.3 5.7 4.5" />
  </>
);
const wall = (
  <>
    <Rect x={3} y={3} width={18} height={18} rx={2} />
    <Path d="M12 3v18M3 12h18" />
    <Path d="m3 12 9-9 9 9-9 9Z" />
  </>
);
const matside = (color: string) => (
  <>
    <Rect x={2.5} y={3.5} width={12} height={17} rx={2} />
    <Path d="M6.5 3.5v17M10.5 3.5v17M2.5 9.2h12M2.5 14.8h12" strokeWidth={1} strokeOpacity={0.75} />
    <Rect x={17.5} y={8} width={4.5} height={9} rx={1.2} fill={color} />
  </>
);

const GLYPHS: Record<OwnGlyphName, (color: string) => ReactElement> = {
  table: () => table,
  machine: () => machine,
  iron: () => iron,
  chair: () => chair,
  wall: () => wall,
  matside,
};

/** Draws one of our own glyphs: rotary cutter, machine, iron, needle, block, mat with phone. */
export function OwnGlyph({
  name,
  size,
  color,
}: {
  name: OwnGlyphName;
  size: number;
  color: string;
}) {
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" fill="none">
      <G stroke={color} strokeWidth={2} strokeLinecap="round" strokeLinejoin="round">
        {GLYPHS[name](color)}
      </G>
    </Svg>
  );
}
