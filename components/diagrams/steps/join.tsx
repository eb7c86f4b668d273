import { Circle } from 'react-native-svg';

import { Facts } from '@/components/diagrams/parts/facts';
import { Grid } from '@/components/diagrams/parts/grid';
import { ClothLetter, Piece, Seam } from '@/components/diagrams/parts/marks';
import { HALO } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { inset } from '@/shared/geometry/drawing/fit';
import { layOutJoin } from '@/shared/geometry/drawing/join-layout';

const LEAST_LETTER_PX = 11;
const FACTS_WIDTH = 118;

/** Units side by side in ring order; the seam to sew now is dashed, the shoulders meet. */
function JoinDrawing({ scene, kind }: { scene: Scene; kind: 'quarter' | 'half' | 'ring' }) {
  const { plan, shape, lane, box, paints } = scene;
  const room = inset(box, 14, 12, FACTS_WIDTH, 12);
  const layout = layOutJoin(plan, shape, kind, lane, room);
  if (!layout) return null;
  const { wedges, letterPx, seams, fit } = layout;
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      {wedges.map(({ letter, points }, index) => (
        <Piece
          key={index}
          points={points}
          fill={paints.of(letter).right}
          line={paints.outline}
          width={1.2}
        />
      ))}
      {seams.map((seam, index) => (
        <Seam key={index} points={seam} color={paints.seam} halo />
      ))}
      {seams.map((seam, index) => (
        <ShoulderMark key={index} at={seam[1]} color={paints.seam} />
      ))}
      {letterPx >= LEAST_LETTER_PX &&
        wedges.map(({ letter, letterAt }, index) => (
          <ClothLetter
            key={index}
            paint={paints.of(letter)}
            at={letterAt}
            px={Math.max(13, letterPx)}
          />
        ))}
      <Facts
        at={[box.x + box.width - FACTS_WIDTH + 10, box.y + box.height / 2 - 16]}
        lines={[seamWords(seams.length), 'Shoulders', 'meet']}
        paints={paints}
      />
    </>
  );
}

const seamWords = (count: number): string => (count === 1 ? '1 seam' : `${count} seams`);

function ShoulderMark(props: { at: readonly [number, number] | undefined; color: string }) {
  const [x, y] = props.at ?? [0, 0];
  return <Circle cx={x} cy={y} r={4.5} fill={HALO} stroke={props.color} strokeWidth={2} />;
}

export const QuarterDrawing = (scene: Scene) => <JoinDrawing scene={scene} kind="quarter" />;
export const HalfDrawing = (scene: Scene) => <JoinDrawing scene={scene} kind="half" />;
export const RingJoinDrawing = (scene: Scene) => <JoinDrawing scene={scene} kind="ring" />;
