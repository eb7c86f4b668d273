import { CutsDrawing } from '@/components/diagrams/parts/cuts';
import { Grid } from '@/components/diagrams/parts/grid';
import { LevelDimension, UprightDimension } from '@/components/diagrams/parts/label';
import { Arrow, Piece } from '@/components/diagrams/parts/marks';
import type { FabricPaint, Paints } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { Path } from 'react-native-svg';
import { foldSequence } from '@/shared/geometry/drawing/fold-sequence';
import { batchAt, cornersOf, layOutCuts } from '@/shared/geometry/drawing/strip-layout';
import { pathOf, type Box, type Point } from '@/shared/geometry/drawing/points';
import { toInches } from '@/shared/geometry/drawing/to-inches';
import { formatInches } from '@/shared/units/format-fraction';

/** Background squares, cut from a strip across the whole width of the cloth. */
export function BackgroundCutDrawing({ plan, lane, done, box, leftHanded, paints }: Scene) {
  const { cut } = plan.geometry.background;
  const partIn = toInches(cut);
  const clothIn = Math.max(partIn, toInches(plan.request.cloth.usableWidth));
  const batch = batchAt(done, lane?.target ?? 1, Math.floor(clothIn / partIn));
  const left = 74;
  const scale = Math.min((box.width - left - 20) / clothIn, (box.height - 56) / partIn);
  const room: Box = {
    x: box.x + left + Math.max(0, (box.width - left - 20 - clothIn * scale) / 2),
    y: box.y + 34 + Math.max(0, (box.height - 56 - partIn * scale) / 2),
    width: clothIn * scale,
    height: partIn * scale,
  };
  const layout = layOutCuts({
    clothIn,
    partIn,
    startIn: 0,
    count: batch.count,
    done: batch.done,
    scale,
    heightPx: room.height,
    room,
    leftHanded,
  });
  const part = layout.parts.find(({ state }) => state !== 'done') ?? layout.parts[0];
  const ink = { color: paints.theme.color.ink, halo: paints.theme.color.card };
  return (
    <>
      <Grid box={box} fit={{ scale, dx: room.x, dy: room.y }} paints={paints} />
      <CutsDrawing
        layout={layout}
        paint={paints.of(plan.request.background.fabric)}
        paints={paints}
        leftHanded={leftHanded}
        before={batch.start}
      />
      {part && (
        <LevelDimension
          from={[part.box.x, room.y - 12]}
          to={[part.box.x + part.box.width, room.y - 12]}
          text={formatInches(cut)}
          {...ink}
        />
      )}
      <UprightDimension
        from={[room.x - 11, room.y]}
        to={[room.x - 11, room.y + room.height]}
        text={formatInches(cut)}
        {...ink}
      />
    </>
  );
}

/** Folded in half, in half again, and opened out: the creases are the lines for the ring. */
export function BackgroundFoldDrawing({ plan, box, paints }: Scene) {
  const paint = paints.of(plan.request.background.fabric);
  const sideIn = toInches(plan.geometry.background.cut);
  const { states, arrows, side } = foldSequence(box);
  const { ink } = paints.theme.color;
  const first = states[0];
  const fit = { scale: side / sideIn, dx: first?.cloth.x ?? 0, dy: first?.cloth.y ?? 0 };
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      {states.map(({ cloth, folds, creases, whole }, index) => (
        <Folded
          key={index}
          cloth={cloth}
          folds={folds}
          creases={creases}
          fill={whole ? paint.right : paint.wrong}
          paint={paint}
          paints={paints}
        />
      ))}
      {arrows.map(([from, to], index) => (
        <Arrow key={index} from={from} to={to} color={ink} />
      ))}
    </>
  );
}

interface FoldedProps {
  cloth: Box;
  folds: [Point, Point][];
  creases: [Point, Point][];
  fill: string;
  paint: FabricPaint;
  paints: Paints;
}

function Folded({ cloth, folds, creases, fill, paint, paints }: FoldedProps) {
  return (
    <>
      <Piece points={cornersOf(cloth)} fill={fill} line={paints.outline} width={1.2} />
      {folds.map((fold, index) => (
        <Path key={`f${index}`} d={pathOf(fold, false)} stroke={paint.ink} strokeWidth={3.5} />
      ))}
      {creases.map((crease, index) => (
        <Path
          key={`c${index}`}
          d={pathOf(crease, false)}
          stroke={paint.ink}
          strokeWidth={1.4}
          strokeDasharray="5 4"
        />
      ))}
    </>
  );
}
