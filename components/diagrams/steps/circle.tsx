import { Circle, Path, Rect } from 'react-native-svg';

import { Facts } from '@/components/diagrams/parts/facts';
import { Grid } from '@/components/diagrams/parts/grid';
import { Label, LevelDimension } from '@/components/diagrams/parts/label';
import { ClothLetter, CutLine } from '@/components/diagrams/parts/marks';
import type { Scene } from '@/components/diagrams/parts/scene';
import { circleSizes } from '@/shared/geometry/drawing/circle-sizes';
import { circlePoints, ringPath } from '@/shared/geometry/drawing/circle-points';
import { fitInto, inset } from '@/shared/geometry/drawing/fit';
import { twoPanels } from '@/shared/geometry/drawing/points';
import { formatExact, formatInches } from '@/shared/units/format-fraction';

/** The centre circle drawn on its square: cut on the line. */
export function CircleCutDrawing({ plan, box, paints }: Scene) {
  const sizes = circleSizes(plan);
  if (!sizes) return null;
  const paint = paints.of(sizes.letter);
  const side = sizes.squareIn;
  const fit = fitInto({ x: 0, y: 0, width: side, height: side }, inset(box, 20, 12, 150, 12));
  const px = side * fit.scale;
  const centre: [number, number] = [fit.dx + px / 2, fit.dy + px / 2];
  const r = (sizes.cutIn / 2) * fit.scale;
  const [cx, cy] = centre;
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      <Rect
        x={fit.dx}
        y={fit.dy}
        width={px}
        height={px}
        fill={paint.right}
        stroke={paints.outline}
        strokeWidth={1.2}
      />
      <CutLine points={circlePoints(cx, cy, r)} color={paints.cut} halo={paint.dark} closed />
      <LevelDimension
        from={[cx - r, cy]}
        to={[cx + r, cy]}
        text={formatInches(sizes.cut)}
        color={paint.ink}
        halo={paint.cloth}
      />
      <Facts
        at={[fit.dx + px + 22, box.y + box.height / 2 - 14]}
        lines={[
          `${formatInches(sizes.cut)} across`,
          `from a ${formatInches(sizes.square)}`,
          'square',
        ]}
        paints={paints}
      />
    </>
  );
}

/** The circle's edge turned over a template: from the back, and from the front. */
export function CircleTurnDrawing({ plan, box, paints }: Scene) {
  const sizes = circleSizes(plan);
  if (!sizes) return null;
  const paint = paints.of(sizes.letter);
  const [left, right] = twoPanels(box);
  const whole = {
    x: -sizes.cutIn / 2,
    y: -sizes.cutIn / 2,
    width: sizes.cutIn,
    height: sizes.cutIn,
  };
  const back = fitInto(whole, inset(left, 54, 12, 6, 12));
  const front = fitInto(whole, inset(right, 54, 12, 10, 12));
  const scale = back.scale;
  const finished = sizes.finishedIn * scale;
  const inner = Math.max(1, (sizes.finishedIn - sizes.turningIn) * scale);
  const { ink2 } = paints.theme.color;
  const line = { stroke: paints.outline, strokeWidth: 1.2 };
  return (
    <>
      <Grid box={box} fit={back} paints={paints} />
      <Circle
        cx={back.dx}
        cy={back.dy}
        r={(sizes.cutIn / 2) * scale}
        fill="none"
        stroke={paints.outline}
        strokeWidth={1.2}
        strokeDasharray="3 4"
      />
      <Circle cx={back.dx} cy={back.dy} r={finished} fill={paint.wrong} {...line} />
      <Path
        d={ringPath(back.dx, back.dy, finished, inner)}
        fill={paint.right}
        fillRule="evenodd"
        {...line}
      />
      <Circle cx={front.dx} cy={front.dy} r={finished} fill={paint.right} {...line} />
      <ClothLetter paint={paint} at={[front.dx, front.dy - 14]} px={16} />
      <LevelDimension
        from={[front.dx - finished, front.dy + 20]}
        to={[front.dx + finished, front.dy + 20]}
        text={`${formatExact(2 * sizes.finishedIn)} in`}
        color={paint.ink}
        halo={paint.cloth}
      />
      <Label at={[box.x + 16, box.y + 26]} text="Back" color={ink2} px={15} />
      <Label at={[box.x + box.width / 2 + 8, box.y + 26]} text="Front" color={ink2} px={15} />
    </>
  );
}
