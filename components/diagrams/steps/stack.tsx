import { Grid } from '@/components/diagrams/parts/grid';
import { Label } from '@/components/diagrams/parts/label';
import { LayerRows, LayersFromAbove } from '@/components/diagrams/parts/layers';
import { ClothLetter } from '@/components/diagrams/parts/marks';
import type { Scene } from '@/components/diagrams/parts/scene';
import { stackRun } from '@/shared/geometry/drawing/cut-run';
import { layOutTumbling } from '@/shared/geometry/drawing/tumbling-layout';

/** Lengths laid one on the other, lightest on top, edges together. */
export function StackDrawing({ plan, lane, box, paints }: Scene) {
  const run = stackRun(plan, lane);
  const layout = layOutTumbling(run, box, false);
  const { clip, rows, offset } = layout;
  const width = Math.min(layout.cloth.width, clip.width);
  const top = paints.of(run.layers[0] ?? '');
  const { ink2 } = paints.theme.color;
  return (
    <>
      <Grid box={box} fit={layout.fit} paints={paints} />
      <LayersFromAbove
        letters={run.layers}
        box={{ ...clip, width }}
        offset={Math.max(offset, Math.min(6, 24 / run.layers.length))}
        paints={paints}
      />
      <ClothLetter paint={top} at={[clip.x + width / 2, clip.y + clip.height / 2]} px={22} />
      <LayerRows letters={run.layers} box={rows} paints={paints} />
      {layout.roomy && (
        <Label
          at={[rows.x + rows.width / 2, rows.y - 12]}
          text="From the top"
          color={ink2}
          anchor="middle"
        />
      )}
    </>
  );
}
