import { Circle, Line, Rect } from 'react-native-svg';

import { RingDrawing } from '@/components/diagrams/block-drawing';
import { Facts } from '@/components/diagrams/parts/facts';
import { Grid } from '@/components/diagrams/parts/grid';
import { LevelDimension } from '@/components/diagrams/parts/label';
import { CutLine, Piece, Seam } from '@/components/diagrams/parts/marks';
import { DARK, HALO } from '@/components/diagrams/parts/paints';
import { RulerAndCut } from '@/components/diagrams/parts/ruler';
import type { Scene } from '@/components/diagrams/parts/scene';
import { circlePoints } from '@/shared/geometry/drawing/circle-points';
import { plateLetters } from '@/shared/geometry/drawing/find-unit';
import { applyFit, fitInto, inset, type Fit } from '@/shared/geometry/drawing/fit';
import { placeWedge } from '@/shared/geometry/drawing/place-wedge';
import { drawIn, holeEdge, ringOuterEdge } from '@/shared/geometry/drawing/ring-edges';
import { cornersOf } from '@/shared/geometry/drawing/strip-layout';
import type { Box } from '@/shared/geometry/drawing/points';
import { halfOf, toInches } from '@/shared/geometry/drawing/to-inches';
import { preparedWedge } from '@/shared/geometry/drawing/wedge-outlines';
import { formatInches } from '@/shared/units/format-fraction';

const FACTS_WIDTH = 138;
const STITCH_IN_FROM_EDGE = 0.12; // inches
const LEAST_FOR_MEASURE = 240; // pixels

const square = (sideIn: number): Box => ({
  x: -sideIn / 2,
  y: -sideIn / 2,
  width: sideIn,
  height: sideIn,
});

const boxOf = (fit: Fit, sideIn: number): Box => ({
  x: fit.dx - (sideIn / 2) * fit.scale,
  y: fit.dy - (sideIn / 2) * fit.scale,
  width: sideIn * fit.scale,
  height: sideIn * fit.scale,
});

const factsAt = (box: Box): [number, number] => [
  box.x + box.width - FACTS_WIDTH + 12,
  box.y + box.height / 2 - 14,
];

/** A line of stitches around an open hole, close to its raw edge. */
export function StayStitchDrawing({ plan, shape, box, paints }: Scene) {
  const shownIn = Math.min(shape.reachIn, shape.narrowIn * 1.9 + 0.6);
  const view = {
    x: -shape.reachIn,
    y: -shownIn,
    width: 2 * shape.reachIn,
    height: 2 * shownIn,
  };
  const fit = fitInto(view, inset(box, 14, 4, FACTS_WIDTH, 4));
  const letters = plateLetters(plan);
  const stitchIn =
    (shape.narrowIn + shape.holeIn) / 2 + (shape.holeIn === shape.narrowIn ? 0.12 : 0);
  const outline = preparedWedge(shape, false, false);
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      {letters.map((letter, index) => (
        <Piece
          key={index}
          points={applyFit(fit, placeWedge(shape, index, outline))}
          fill={paints.of(letter).right}
          line={paints.outline}
        />
      ))}
      <Seam points={applyFit(fit, holeEdge(shape, stitchIn))} color={paints.seam} closed halo />
      <Facts
        at={factsAt(box)}
        lines={['Around the hole', 'on the edge', 'to turn under']}
        paints={paints}
      />
    </>
  );
}

/** The ring and its centre on the folded background, stitched close to their edges. */
export function AppliqueDrawing(scene: Scene) {
  const { plan, shape, box, paints } = scene;
  const sideIn = toInches(plan.geometry.background.cut);
  const fit = fitInto(square(sideIn), inset(box, 18, 10, FACTS_WIDTH, 10));
  const onFolds = plan.request.wedges % 4 === 0;
  const edge = drawIn(ringOuterEdge(shape), STITCH_IN_FROM_EDGE);
  const inner = shape.circleIn;
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      <BlockOnCloth scene={scene} fit={fit} sideIn={sideIn} />
      <Seam points={applyFit(fit, edge)} color={paints.seam} fine={fit.scale < 16} closed halo />
      <Seam
        points={
          inner === null
            ? applyFit(fit, holeEdge(shape, shape.holeIn + STITCH_IN_FROM_EDGE))
            : circlePoints(fit.dx, fit.dy, (inner - STITCH_IN_FROM_EDGE) * fit.scale)
        }
        color={paints.seam}
        fine={fit.scale < 16}
        closed
        halo
      />
      <Facts
        at={factsAt(box)}
        lines={onFolds ? ['Seams on', 'the fold lines'] : ['First seam', 'on a fold line']}
        paints={paints}
      />
    </>
  );
}

/** The block trimmed to size: measured from its centre, half each way. */
export function BlockTrimDrawing(scene: Scene) {
  const { plan, box, paints, leftHanded } = scene;
  const { cut, trim } = plan.geometry.background;
  const fit = fitInto(square(toInches(cut)), inset(box, 26, 10, FACTS_WIDTH, 14));
  const paint = paints.of(plan.request.background.fabric);
  const inner = boxOf(fit, toInches(trim));
  const [topLeft, topRight, bottomRight, bottomLeft] = cornersOf(inner);
  const right = inner.x + inner.width;
  const edge = leftHanded ? inner.x : right;
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      <BlockOnCloth scene={scene} fit={fit} sideIn={toInches(cut)} />
      <CutLine
        points={[topLeft, topRight, bottomRight, bottomLeft].flatMap((p) => (p ? [p] : []))}
        color={paints.cut}
        closed
        halo
      />
      <RulerAndCut
        paints={paints}
        cut={[
          [edge, inner.y + inner.height],
          [edge, inner.y],
        ]}
        scale={fit.scale}
        width={Math.max(14, Math.min(30, fit.scale * 2))}
        side={leftHanded ? 1 : -1}
        halo={paint.dark}
        overhang={5}
      />
      {box.height >= LEAST_FOR_MEASURE && (
        <LevelDimension
          from={[fit.dx, fit.dy]}
          to={[edge, fit.dy]}
          text={formatInches(halfOf(trim))}
          color={DARK}
          halo={HALO}
        />
      )}
      <Circle cx={fit.dx} cy={fit.dy} r={3.5} fill={DARK} stroke={HALO} strokeWidth={1.5} />
      <Facts
        at={factsAt(box)}
        lines={[
          `${formatInches(trim)} square`,
          `${formatInches(halfOf(trim))} each way`,
          'from the centre',
        ]}
        paints={paints}
      />
    </>
  );
}

function BlockOnCloth({ scene, fit, sideIn }: { scene: Scene; fit: Fit; sideIn: number }) {
  const { plan, shape, paints } = scene;
  const paint = paints.of(plan.request.background.fabric);
  const cloth = boxOf(fit, sideIn);
  const fold = { stroke: paint.ink, strokeOpacity: 0.7, strokeDasharray: '4 4' };
  return (
    <>
      <Rect {...cloth} fill={paint.right} stroke={paints.outline} strokeWidth={1.2} />
      <Line x1={fit.dx} y1={cloth.y} x2={fit.dx} y2={cloth.y + cloth.height} {...fold} />
      <Line x1={cloth.x} y1={fit.dy} x2={cloth.x + cloth.width} y2={fit.dy} {...fold} />
      <RingDrawing plan={plan} shape={shape} paints={paints} fit={fit} letters={false} />
    </>
  );
}
