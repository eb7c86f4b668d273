import { Path } from 'react-native-svg';

import { Grid } from '@/components/diagrams/parts/grid';
import { Label } from '@/components/diagrams/parts/label';
import { ClothLetter, Piece, Seam } from '@/components/diagrams/parts/marks';
import { type FabricPaint, HALO } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { applyFit, fitInto, inset, type Fit } from '@/shared/geometry/drawing/fit';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import { letterAt, placeAtAngle } from '@/shared/geometry/drawing/place-wedge';
import { pathOf, twoPanels, type Point } from '@/shared/geometry/drawing/points';
import { tipView } from '@/shared/geometry/drawing/tip-view';
import {
  preparedWedge,
  templateEdge,
  tipFlap,
  turnedBand,
} from '@/shared/geometry/drawing/wedge-outlines';

/** The tip made: from the back, with what is turned under, and from the front. */
export function TipTurnDrawing(scene: Scene) {
  const { shape, box, paints, plan, lane } = scene;
  const paint = paints.of(laneLetters(lane)[0] ?? plan.geometry.ring.order[0] ?? '');
  const [left, right] = twoPanels(box);
  const view = tipView(shape);
  const back = fitInto(view, inset(left, 16, 32, 16, 0));
  const front = fitInto(view, inset(right, 16, 32, 16, 0));
  const outline = preparedWedge(shape);
  const { ink2 } = paints.theme.color;
  const up = (fit: Fit, points: readonly Point[]) => applyFit(fit, placeAtAngle(points, 0));
  const [letter] = up(front, [[Math.min(letterAt(shape)[0], -view.y - view.height * 0.6), 0]]);
  return (
    <>
      <Grid box={box} fit={back} paints={paints} />
      <Piece points={up(back, outline)} fill={paint.wrong} line={paints.outline} width={1.3} />
      {shape.tip === 'pointed' ? (
        <PointedBack scene={scene} fit={back} paint={paint} />
      ) : (
        <>
          <Piece points={up(back, turnedBand(shape))} fill={paint.right} line={paints.outline} />
          <Path
            d={pathOf(up(back, templateEdge(shape)), false)}
            fill="none"
            stroke={paints.seam}
            strokeWidth={1.6}
            strokeDasharray="3 3"
          />
        </>
      )}
      <Piece points={up(front, outline)} fill={paint.right} line={paints.outline} width={1.3} />
      {shape.tip === 'pointed' && (
        <Path
          d={pathOf(rightAngleMark(up(front, [[shape.reachIn, 0]])[0] ?? [0, 0]), false)}
          fill="none"
          stroke={paint.ink}
          strokeWidth={1.6}
        />
      )}
      {letter && <ClothLetter paint={paint} at={letter} px={17} />}
      <Label at={[left.x + 16, box.y + 24]} text="Back" color={ink2} px={15} />
      <Label at={[right.x + 16, box.y + 24]} text="Front" color={ink2} px={15} />
    </>
  );
}

/** The flap of a turned point: its right side shows, its seam lies on the axis. */
function PointedBack({ scene, fit, paint }: { scene: Scene; fit: Fit; paint: FabricPaint }) {
  const { shape, paints } = scene;
  const flap = applyFit(fit, placeAtAngle(tipFlap(shape), 0));
  const [tip, , end] = flap;
  return (
    <>
      <Piece points={flap} fill={paint.right} line={paints.outline} />
      {tip && end && (
        <>
          {paint.dark && (
            <Path d={pathOf([tip, end], false)} stroke={HALO} strokeWidth={5} fill="none" />
          )}
          <Seam points={[tip, end]} color={paints.seam} sewn />
        </>
      )}
    </>
  );
}

const rightAngleMark = ([x, y]: Point): Point[] => [
  [x - 11, y + 11],
  [x, y + 22],
  [x + 11, y + 11],
];
