import { Circle, Path, Pattern, Rect } from 'react-native-svg';

import { letterInk, printColour } from '@/shared/geometry/drawing/cloth-colours';
import type { RequestFabric } from '@/shared/model/plan-request';

export type PrintKind = 'dots' | 'rings' | 'waves' | 'crosses' | 'lines' | 'seeds';

export interface Cloth {
  cloth: string;
  /** the print's lines or dots */
  print: string;
  /** the letter on it, at least 4.5:1 */
  letter: string;
  printKind: PrintKind;
}

const WEDGE_PRINTS = ['dots', 'rings', 'waves', 'crosses', 'lines'] as const;

/** The dyes of the look: their prints and inks were mixed by eye. */
const DYES: Record<string, Pick<Cloth, 'print' | 'letter'>> = {
  '#EFE5D0': { print: '#C9B68F', letter: '#2A2017' },
  '#E0AC35': { print: '#F6D583', letter: '#2A2017' },
  '#86AAB8': { print: '#B9D0D8', letter: '#17232A' },
  '#B04A37': { print: '#D07A66', letter: '#FFFAF0' },
  '#263C69': { print: '#5A73A6', letter: '#FFFAF0' },
  '#DDE0D8': { print: '#C3C9BF', letter: '#2A2017' },
};

type Dyed = Pick<RequestFabric, 'letter' | 'role' | 'colour'>;

/** The print goes by the letter, so that neighbours differ even without colour. */
function printOf(fabric: Dyed): PrintKind {
  if (fabric.role === 'background') return 'seeds';
  return WEDGE_PRINTS[(fabric.letter.charCodeAt(0) - 65) % WEDGE_PRINTS.length] ?? 'dots';
}

const known = new Map<string, Pick<Cloth, 'print' | 'letter'>>();

function inksOf(colour: string): Pick<Cloth, 'print' | 'letter'> {
  const found = DYES[colour] ?? known.get(colour);
  if (found) return found;
  const inks = { print: printColour(colour), letter: letterInk(colour) };
  known.set(colour, inks);
  return inks;
}

/** How a fabric is drawn: its true colour, a print, and a letter that can be read on both. */
export const clothOf = (fabric: Dyed): Cloth => ({
  cloth: fabric.colour,
  ...inksOf(fabric.colour),
  printKind: printOf(fabric),
});

const TILES: Record<PrintKind, { width: number; height: number; turn: number }> = {
  dots: { width: 9, height: 9, turn: 30 },
  rings: { width: 14, height: 14, turn: 0 },
  waves: { width: 12, height: 7, turn: 0 },
  crosses: { width: 10, height: 10, turn: 45 },
  lines: { width: 13, height: 13, turn: 20 },
  seeds: { width: 11, height: 11, turn: 0 },
};

function PrintMarks({ kind, color }: { kind: PrintKind; color: string }) {
  const line = { fill: 'none', stroke: color };
  switch (kind) {
    case 'dots':
      return <Circle cx={4.5} cy={4.5} r={1} fill={color} />;
    case 'rings':
      return <Circle cx={7} cy={7} r={3} strokeWidth={1.3} {...line} />;
    case 'waves':
      return <Path d="M0 3.5q3-3 6 0t6 0" strokeWidth={1.2} {...line} />;
    case 'crosses':
      return <Path d="M5 3v4M3 5h4" strokeWidth={1.3} {...line} />;
    case 'lines':
      return <Path d="M0 6.5h13" strokeWidth={1} {...line} />;
    case 'seeds':
      return (
        <>
          <Circle cx={3} cy={3} r={0.9} fill={color} />
          <Circle cx={8.5} cy={8.5} r={0.9} fill={color} />
        </>
      );
  }
}

/** A fabric's print as an SVG pattern, for `<Defs>`; fill with `url(#id)`. */
export function ClothPattern({
  id,
  fabric,
  scale = 1,
}: {
  id: string;
  fabric: Dyed;
  scale?: number;
}) {
  const { cloth, print, printKind } = clothOf(fabric);
  const { width, height, turn } = TILES[printKind];
  return (
    <Pattern
      id={id}
      width={width}
      height={height}
      patternUnits="userSpaceOnUse"
      patternTransform={`rotate(${turn}) scale(${scale})`}
    >
      <Rect width={width} height={height} fill={cloth} />
      <PrintMarks kind={printKind} color={print} />
    </Pattern>
  );
}
