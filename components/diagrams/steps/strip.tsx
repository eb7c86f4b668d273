import { CutsDrawing } from '@/components/diagrams/parts/cuts';
import { Facts } from '@/components/diagrams/parts/facts';
import { Grid } from '@/components/diagrams/parts/grid';
import { LevelDimension } from '@/components/diagrams/parts/label';
import type { Scene } from '@/components/diagrams/parts/scene';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import { batchAt, layOutCuts } from '@/shared/geometry/drawing/strip-layout';
import { toInches } from '@/shared/geometry/drawing/to-inches';
import { formatInches } from '@/shared/units/format-fraction';

const SHOWN = 3; // strips beside each other, so that one is wide enough to read

/** Strips cut across the width: the cloth lies with its width away from the maker. */
export function StripDrawing({ plan, lane, done, box, leftHanded, paints }: Scene) {
  const paint = paints.of(laneLetters(lane)[0] ?? plan.request.fabrics[0]?.letter ?? '');
  const partIn = toInches(plan.geometry.wedge.stripHeight);
  const batch = batchAt(done, lane?.target ?? 1, SHOWN);
  const room = { x: box.x + 20, y: box.y + 38, width: box.width - 170, height: box.height };
  const clothIn = (batch.count + 0.55) * partIn;
  const scale = Math.min(room.width / clothIn, 130 / partIn);
  const layout = layOutCuts({
    clothIn,
    partIn,
    startIn: 0,
    count: batch.count,
    done: batch.done,
    scale,
    heightPx: box.height,
    room: { ...room, width: clothIn * scale },
    leftHanded,
  });
  const part = layout.parts.find(({ state }) => state !== 'done') ?? layout.parts[0];
  const { ink, card } = paints.theme.color;
  const { usableWidth } = plan.request.cloth;
  return (
    <>
      <Grid box={box} fit={{ scale, dx: layout.cloth.x, dy: room.y }} paints={paints} />
      <CutsDrawing
        layout={layout}
        paint={paint}
        paints={paints}
        leftHanded={leftHanded}
        before={batch.start}
        lift={58}
        badgesAt={room.y + (box.height - room.y) / 2}
      />
      {part && (
        <LevelDimension
          from={[part.box.x, room.y - 12]}
          to={[part.box.x + part.box.width, room.y - 12]}
          text={formatInches(plan.geometry.wedge.stripHeight)}
          color={ink}
          halo={card}
        />
      )}
      <Facts
        at={[layout.cloth.x + layout.cloth.width + 20, box.y + box.height / 2 - 8]}
        lines={[formatInches(usableWidth), 'selvage to', 'selvage']}
        paints={paints}
      />
    </>
  );
}
