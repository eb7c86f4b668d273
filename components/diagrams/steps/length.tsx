import { CutsDrawing } from '@/components/diagrams/parts/cuts';
import { Grid } from '@/components/diagrams/parts/grid';
import { LevelDimension, UprightDimension } from '@/components/diagrams/parts/label';
import type { Scene } from '@/components/diagrams/parts/scene';
import { lengthBatch } from '@/shared/geometry/drawing/length-batch';
import { layOutCuts } from '@/shared/geometry/drawing/strip-layout';
import { toInches } from '@/shared/geometry/drawing/to-inches';
import { formatInches } from '@/shared/units/format-fraction';

const LEAST_HEIGHT_PX = 24;

/** A strip cut into lengths; a strip too fine to read at its whole width shows the part at hand. */
export function LengthDrawing({ plan, lane, done, box, leftHanded, paints }: Scene) {
  const batch = lengthBatch(plan, lane, done);
  const paint = paints.of(batch.letter);
  const heightIn = toInches(plan.geometry.wedge.stripHeight);
  const clothIn = toInches(plan.request.cloth.usableWidth);
  const left = 58;
  const width = box.width - left - 18;
  const most = (box.height - 84) / heightIn;
  const scale = Math.max(
    Math.min(width / clothIn, most),
    Math.min(most, LEAST_HEIGHT_PX / heightIn),
  );
  const heightPx = heightIn * scale;
  const y = box.y + 38 + Math.max(0, (box.height - 76 - heightPx) / 2);
  const layout = layOutCuts({
    clothIn,
    partIn: batch.lengthIn,
    startIn: 0,
    count: batch.count,
    done: batch.done,
    scale,
    heightPx,
    room: { x: box.x + left, y, width, height: heightPx },
    leftHanded,
  });
  const part = layout.parts.find(({ state }) => state !== 'done') ?? layout.parts[0];
  const ink = { color: paints.theme.color.ink, halo: paints.theme.color.card };
  return (
    <>
      <Grid box={box} fit={{ scale, dx: layout.cloth.x, dy: y }} paints={paints} />
      <CutsDrawing layout={layout} paint={paint} paints={paints} leftHanded={leftHanded} />
      {part && (
        <LevelDimension
          from={[part.box.x, y - 13]}
          to={[part.box.x + part.box.width, y - 13]}
          text={formatInches(batch.length)}
          {...ink}
        />
      )}
      <UprightDimension
        from={[box.x + left - 10, y]}
        to={[box.x + left - 10, y + heightPx]}
        text={formatInches(plan.geometry.wedge.stripHeight)}
        {...ink}
      />
    </>
  );
}
