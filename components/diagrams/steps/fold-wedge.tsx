import { Arrow, ClothLetter, CutLine, Piece, Seam } from '@/components/diagrams/parts/marks';
import { Grid } from '@/components/diagrams/parts/grid';
import { Label, LevelDimension } from '@/components/diagrams/parts/label';
import { DARK, HALO } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { Path } from 'react-native-svg';
import { applyFit, fitInto, fitPoints, inset, type Fit } from '@/shared/geometry/drawing/fit';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import { pathOf, twoPanels } from '@/shared/geometry/drawing/points';
import { halfOf, toInches } from '@/shared/geometry/drawing/to-inches';
import { cutWedge, foldedWedge, rawHalf } from '@/shared/geometry/drawing/wedge-outlines';
import type { FractionText } from '@/shared/model/length';
import { formatInches } from '@/shared/units/format-fraction';

const paintOf = ({ paints, plan, lane }: Scene) =>
  paints.of(laneLetters(lane)[0] ?? plan.geometry.ring.order[0] ?? '');

/** Fold on the axis, right sides together, and sew across the wide end. */
export function TipSewDrawing(scene: Scene) {
  const { shape, box, paints, plan } = scene;
  const paint = paintOf(scene);
  const [left, right] = twoPanels(box, 0.47);
  const flat = fitPoints(cutWedge(shape), inset(left, 16, 14));
  const folded: Fit = {
    scale: flat.scale,
    dx: right.x + 30 - shape.narrowIn * flat.scale,
    dy: flat.dy + (rawHalf(shape, shape.wideIn) * flat.scale) / 2 + 8,
  };
  const { ink, ink2, card } = paints.theme.color;
  const seam = applyFit(folded, seamAcross(scene));
  const outer = applyFit(folded, foldedWedge(shape, shape.wideIn));
  const [narrow, fold, wide] = outer;
  const middle = flat.dy;
  const start = flat.dx + shape.narrowIn * flat.scale;
  const end = flat.dx + shape.wideIn * flat.scale;
  return (
    <>
      <Grid box={box} fit={flat} paints={paints} />
      <Piece points={applyFit(flat, cutWedge(shape))} fill={paint.right} line={paints.outline} />
      <Path
        d={pathOf(
          [
            [start, middle],
            [end, middle],
          ],
          false,
        )}
        stroke={paint.ink}
        strokeWidth={1.6}
        strokeDasharray="5 4"
      />
      <ClothLetter paint={paint} at={[start + (end - start) * 0.6, middle]} px={16} />
      <Arrow from={[end + 8, middle]} to={[right.x + 20, middle]} color={ink} />
      <Piece points={outer} fill={paint.wrong} line={paints.outline} width={1.3} />
      {narrow && fold && (
        <>
          <Path d={pathOf([narrow, fold], false)} stroke={DARK} strokeWidth={3} />
          <Label at={[narrow[0], narrow[1] + 19]} text="Fold" color={ink2} />
        </>
      )}
      <Seam points={seam} color={paints.seam} />
      {wide && seam[0] && (
        <LevelDimension
          from={[seam[0][0], wide[1] - 10]}
          to={[wide[0], wide[1] - 10]}
          text={formatInches(tipSeam(plan))}
          color={ink}
          halo={card}
        />
      )}
    </>
  );
}

/** Trim the seam allowance of the tip to half, clear of the stitches. */
export function TipTrimDrawing(scene: Scene) {
  const { shape, box, paints } = scene;
  const paint = paintOf(scene);
  // the wide end alone, so that an eighth of an inch can be seen
  const half = Math.min(1.3, rawHalf(shape, shape.wideIn));
  const room = { x: shape.reachIn - half * 2, y: -half, width: half * 2 + 0.4, height: half };
  const fit = fitInto(room, inset(box, 24, 18, 104, 46));
  const trimIn = shape.reachIn + toInches(trimmedTo(scene));
  const trim = applyFit(fit, [
    [trimIn, 0],
    [trimIn, -rawHalf(shape, trimIn)],
  ]);
  const seam = applyFit(fit, seamAcross(scene));
  const [, fold] = applyFit(fit, foldedWedge(shape, shape.wideIn));
  const { ink, ink2, card } = paints.theme.color;
  const waste = applyFit(fit, [
    [trimIn, 0],
    [shape.wideIn, 0],
    [shape.wideIn, -rawHalf(shape, shape.wideIn)],
    [trimIn, -rawHalf(shape, trimIn)],
  ]);
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      <Piece
        points={applyFit(fit, foldedWedge(shape, shape.wideIn))}
        fill={paint.wrong}
        line={paints.outline}
        width={1.3}
      />
      <Piece points={waste} fill={HALO} opacity={0.6} line={DARK} width={0.8} />
      <Seam points={seam} color={paints.seam} sewn />
      <CutLine points={trim} color={paints.cut} />
      <Path d={pathOf(applyFit(fit, foldLine(scene)), false)} stroke={DARK} strokeWidth={3} />
      {fold && seam[0] && trim[0] && (
        <>
          <LevelDimension
            from={[seam[0][0], fold[1] + 31]}
            to={[trim[0][0], fold[1] + 31]}
            text={formatInches(trimmedTo(scene))}
            color={ink}
            halo={card}
          />
          <Label at={[fold[0] + 14, fold[1] - 34]} text="Cut off" color={ink2} />
          <Label at={[box.x + 16, fold[1] + 19]} text="Fold" color={ink2} />
        </>
      )}
    </>
  );
}

const tipSeam = ({ request }: Scene['plan']) =>
  request.tip.shape === 'pointed' ? request.tip.seam : request.tip.turnUnder;

/** What stays of the seam allowance, as the step says; half of it where it does not. */
function trimmedTo({ plan, step }: Scene): FractionText {
  const { trimmed } = step.title.params;
  return typeof trimmed === 'string' ? trimmed : halfOf(tipSeam(plan));
}

const foldLine = ({ shape }: Scene): [number, number][] => [
  [shape.narrowIn, 0],
  [shape.wideIn, 0],
];

const seamAcross = ({ shape }: Scene): [number, number][] => [
  [shape.reachIn, 0],
  [shape.reachIn, -rawHalf(shape, shape.reachIn)],
];
