import { Path, Rect } from 'react-native-svg';

import { Grid } from '@/components/diagrams/parts/grid';
import { Label } from '@/components/diagrams/parts/label';
import { Arrow, ClothLetter, Piece, Seam } from '@/components/diagrams/parts/marks';
import type { Scene } from '@/components/diagrams/parts/scene';
import { layOutChain } from '@/shared/geometry/drawing/chain-layout';
import { findUnit } from '@/shared/geometry/drawing/find-unit';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import type { Point } from '@/shared/geometry/drawing/points';

const LEAST_FOR_WORDS = 130; // pixels

/** Pairs in a chain under the needle: which fabric is on top, where the seam runs. */
export function PairDrawing({ plan, lane, shape, box, paints }: Scene) {
  const letters = laneLetters(lane);
  const pair = letters.length > 1 ? letters : (findUnit(plan, 'pair', lane)?.letters ?? []);
  // opened out, the upper wedge falls to the clockwise side: so the second one lies on top
  const top = paints.of(pair[1] ?? pair[0] ?? '');
  const below = paints.of(pair[0] ?? '');
  const chain = layOutChain(shape, box);
  const { ink, card } = paints.theme.color;
  const right = box.x + box.width;
  return (
    <>
      <Grid box={box} fit={chain.fit} paints={paints} />
      {chain.pairs.map((drawn, index) => (
        <Piece key={`b${index}`} points={drawn.bottom} fill={below.right} line={paints.outline} />
      ))}
      {chain.pairs.map((drawn, index) => (
        <Piece
          key={`t${index}`}
          points={drawn.top}
          fill={top.wrong}
          line={paints.outline}
          width={1.3}
        />
      ))}
      {chain.pairs.map(({ seam: [from, to], sewnFrom, letterAt }, index) => (
        <PairMarks key={index} from={from} to={to} at={sewnFrom} color={paints.seam}>
          <ClothLetter paint={top} at={letterAt} px={15} />
        </PairMarks>
      ))}
      {chain.threads.map((thread, index) => (
        <Path
          key={index}
          d={threadPath(thread)}
          fill="none"
          stroke={paints.theme.color.madderInk}
          strokeWidth={2}
        />
      ))}
      <Needle
        at={chain.needle}
        top={Math.max(box.y + 12, chain.needle[1] - 150)}
        color={paints.outline}
      />
      <Arrow from={[right - 20, box.y + 20]} to={[right - 68, box.y + 20]} color={ink} />
      {box.height >= LEAST_FOR_WORDS && (
        <Label
          at={[box.x + 16, box.y + box.height - 14]}
          text="Wide end first. Short thread between pairs."
          color={ink}
          px={14.5}
          halo={card}
        />
      )}
    </>
  );
}

interface PairMarksProps {
  from: Point;
  to: Point;
  /** x from which the seam is sewn */
  at: number;
  color: string;
  children: React.ReactNode;
}

function PairMarks({ from, to, at, color, children }: PairMarksProps) {
  const turn: Point = [at, from[1]];
  return (
    <>
      {at > from[0] && <Seam points={[from, turn]} color={color} />}
      {at < to[0] && <Seam points={[turn, to]} color={color} sewn />}
      {children}
    </>
  );
}

const threadPath = ([from, to]: [Point, Point]): string => {
  const third = (to[0] - from[0]) / 3;
  return `M${from[0]} ${from[1]}C${from[0] + third} ${from[1] - 4} ${to[0] - third} ${to[1] + 4} ${to[0]} ${to[1]}`;
};

function Needle({ at, top, color }: { at: Point; top: number; color: string }) {
  const [x, y] = at;
  return (
    <>
      <Path d={`M${x} ${top + 6}V${y}`} stroke={color} strokeWidth={3.5} />
      <Path d={`M${x - 3.5} ${y - 12}L${x} ${y + 3}l3.5-15Z`} fill={color} />
      <Rect x={x - 9} y={top} width={18} height={22} rx={4} fill={color} />
    </>
  );
}
