import { Path } from 'react-native-svg';

import { Grid } from '@/components/diagrams/parts/grid';
import { Label } from '@/components/diagrams/parts/label';
import { Arrow, ClothLetter, Piece, Seam } from '@/components/diagrams/parts/marks';
import type { FabricPaint } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { plateLetters } from '@/shared/geometry/drawing/find-unit';
import { applyFit, fitInto, inset, type Fit } from '@/shared/geometry/drawing/fit';
import { boundsOf, twoPanels, type Box, type Point } from '@/shared/geometry/drawing/points';
import { pressView } from '@/shared/geometry/drawing/press-view';

const LEAST_FOR_ARROWS = 130; // pixels

/** Two neighbours from the back, and their seam from the side: open, or all one way round. */
export function RingPressDrawing(scene: Scene) {
  const { plan, shape, box, paints } = scene;
  const letters = plateLetters(plan);
  // from the back, clockwise runs to the left
  const right = paints.of(letters[0] ?? '');
  const left = paints.of(letters[1] ?? letters[0] ?? '');
  const open = plan.request.press === 'open';
  const [backBox, sideBox] = twoPanels(box, 0.52);
  const { ink2 } = paints.theme.color;
  const fit = fitInto(pressView(shape).view, inset(backBox, 54, 36, 10, 0));
  return (
    <>
      <Grid box={box} fit={fit} paints={paints} />
      <BackView scene={scene} fit={fit} left={left} right={right} open={open} />
      <SideView scene={scene} box={sideBox} left={left} right={right} open={open} />
      <Label at={[box.x + 16, box.y + 26]} text="Back" color={ink2} px={15} />
      <Label at={[sideBox.x, box.y + 26]} text="Side view" color={ink2} px={15} />
    </>
  );
}

interface ViewProps {
  scene: Scene;
  left: FabricPaint;
  right: FabricPaint;
  open: boolean;
}

function BackView({ scene, fit, left, right, open }: ViewProps & { fit: Fit }) {
  const { shape, paints, box } = scene;
  const view = pressView(shape);
  const put = (points: Point[]) => applyFit(fit, points);
  const { ink } = paints.theme.color;
  const seam = put(view.seam);
  const top = seam[1] ?? [0, 0];
  const letterAt = (points: Point[]): Point => {
    const bounds = boundsOf(put(points));
    return [bounds.x + bounds.width / 2, bounds.y + Math.min(bounds.width * 0.75, 62)];
  };
  return (
    <>
      <Piece points={put(view.left)} fill={left.wrong} line={paints.outline} width={1.3} />
      <Piece points={put(view.right)} fill={right.wrong} line={paints.outline} width={1.3} />
      {/* pressed to one side, the right wedge's own allowance crosses over and lies on top */}
      <Piece
        points={put(view.overLeft)}
        fill={open ? left.right : right.wrong}
        line={paints.outline}
      />
      {open && <Piece points={put(view.overRight)} fill={right.right} line={paints.outline} />}
      <Seam points={seam} color={paints.seam} sewn halo={left.dark || right.dark} />
      <ClothLetter paint={left} at={letterAt(view.left)} px={16} />
      <ClothLetter paint={right} at={letterAt(view.right)} px={16} />
      {open && <Arrow from={[top[0] + 7, box.y + 24]} to={[top[0] + 36, box.y + 24]} color={ink} />}
      <Arrow from={[top[0] - 7, box.y + 24]} to={[top[0] - 36, box.y + 24]} color={ink} />
    </>
  );
}

function SideView({ scene, box, left, right, open }: ViewProps & { box: Box }) {
  const { paints } = scene;
  const roomy = box.height >= LEAST_FOR_ARROWS;
  const half = Math.min(90, box.width / 2 - 16);
  const x = box.x + half;
  const y = box.y + box.height * 0.62;
  const line = { stroke: paints.outline, strokeWidth: 1.2, strokeLinejoin: 'round' as const };
  const { ink, madderInk } = paints.theme.color;
  return (
    <>
      <Path d={`M${x - half} ${y}H${x}V${y + 9}H${x - half}Z`} fill={left.cloth} {...line} />
      <Path d={`M${x} ${y}H${x + half}V${y + 9}H${x}Z`} fill={right.cloth} {...line} />
      {open ? (
        <>
          <Path d={hem(x - 1, y, -1, 0)} fill={left.cloth} {...line} />
          <Path d={hem(x + 1, y, 1, 0)} fill={right.cloth} {...line} />
        </>
      ) : (
        <>
          <Path d={hem(x, y, -1, 0)} fill={left.cloth} {...line} />
          <Path d={hem(x + 4, y, -1, 10)} fill={right.cloth} {...line} />
        </>
      )}
      <Path
        d={`M${x} ${y - 26}V${y + 18}`}
        stroke={madderInk}
        strokeWidth={2.4}
        strokeDasharray="4 3"
      />
      {roomy && <Arrow from={[x - 8, y - 38]} to={[x - 40, y - 38]} color={ink} />}
      {roomy && open && <Arrow from={[x + 8, y - 38]} to={[x + 40, y - 38]} color={ink} />}
      <Label
        at={[x - half / 2, y + 32]}
        text={left.letter}
        color={ink}
        anchor="middle"
        strong
        px={15}
      />
      <Label
        at={[x + half / 2, y + 32]}
        text={right.letter}
        color={ink}
        anchor="middle"
        strong
        px={15}
      />
    </>
  );
}

/** A seam allowance folded back over its cloth, `raise` pixels above the lower one. */
function hem(x: number, y: number, way: 1 | -1, raise: number): string {
  const h = 12 + raise;
  return [
    `M${x} ${y}`,
    `c0 ${-h * 0.75} ${way * 2} ${-h} ${way * 8} ${-h}`,
    `h${way * 28}v6h${way * -26}`,
    `c${way * -2} 0 ${way * -2} ${h * 0.3} ${way * -2} ${h - 6}Z`,
  ].join('');
}
