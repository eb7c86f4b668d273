import { useId } from 'react';
import { ClipPath, Defs, G, Rect } from 'react-native-svg';

import { Grid } from '@/components/diagrams/parts/grid';
import { LevelDimension, UprightDimension } from '@/components/diagrams/parts/label';
import { LayerRows, LayersFromAbove } from '@/components/diagrams/parts/layers';
import { Badge, LaterCut, Piece } from '@/components/diagrams/parts/marks';
import { DARK, HALO } from '@/components/diagrams/parts/paints';
import { RulerAndCut } from '@/components/diagrams/parts/ruler';
import type { Scene } from '@/components/diagrams/parts/scene';
import { cutRun } from '@/shared/geometry/drawing/cut-run';
import { layOutTumbling, type TumblingLayout } from '@/shared/geometry/drawing/tumbling-layout';
import { formatExact, formatInches } from '@/shared/units/format-fraction';

const LEAST_NUMBER_RADIUS = 10; // pixels

/** A stack under the ruler: what is cut, the piece to cut now, and what comes after. */
export function TumblingDrawing(scene: Scene) {
  const { plan, lane, done, box, leftHanded, paints } = scene;
  const run = cutRun(plan, lane, done);
  const layout = layOutTumbling(run, box, leftHanded);
  const clipId = `clip-${useId().replace(/\W/g, '')}`;
  const top = paints.of(run.layers[0] ?? '');
  const next = layout.pieces.find(({ state }) => state === 'next');
  const { clip, offset } = layout;
  return (
    <>
      <Grid box={box} fit={layout.fit} paints={paints} />
      <Defs>
        <ClipPath id={clipId}>
          <Rect x={clip.x - 1} y={0} width={clip.width + layout.reach + 2} height={box.height} />
        </ClipPath>
      </Defs>
      <G clipPath={`url(#${clipId})`}>
        <LayersFromAbove letters={run.layers} box={layout.cloth} offset={offset} paints={paints} />
        <Pieces layout={layout} ink={top.ink} dark={top.dark} />
        {next && (
          <RulerAndCut
            paints={paints}
            cut={next.cut}
            scale={layout.fit.scale}
            width={Math.min(40, layout.fit.scale * 1.15)}
            side={leftHanded ? 1 : -1}
            halo={top.dark}
            overhang={Math.min(10, box.height * 0.06)}
          />
        )}
        {layout.pieces.map(({ middle, state }, index) =>
          // in a fine run only the next number is written; later ones are dashed lines anyhow
          layout.badgeRadius < LEAST_NUMBER_RADIUS && state === 'later' ? null : (
            <Badge
              key={index}
              at={middle}
              text={String(index + 1)}
              state={state}
              radius={state === 'next' ? Math.max(12, layout.badgeRadius) : layout.badgeRadius}
            />
          ),
        )}
      </G>
      <LayerRows letters={run.layers} box={layout.rows} paints={paints} />
      {layout.roomy && <Measures scene={scene} layout={layout} />}
    </>
  );
}

function Pieces({ layout, ink, dark }: { layout: TumblingLayout; ink: string; dark: boolean }) {
  return layout.pieces.map(({ outline, cut, state }, index) => {
    if (state === 'later') return <LaterCut key={index} points={cut} color={ink} />;
    const next = state === 'next';
    return (
      <Piece
        key={index}
        points={outline}
        fill={HALO}
        opacity={next ? 0.55 : 0}
        // the next piece lies pale under its bold outline, so that line is dark on any cloth
        line={next ? DARK : ink}
        width={next ? 2.5 : dark ? 1.4 : 1.25}
      />
    );
  });
}

function Measures({ scene, layout }: { scene: Scene; layout: TumblingLayout }) {
  const { plan, paints } = scene;
  const { clip } = layout;
  const { wedge } = plan.geometry;
  const ink = { color: paints.theme.color.ink, halo: paints.theme.color.card };
  const piece = layout.pieces.find(({ state }) => state !== 'done') ?? layout.pieces[0];
  const ys = { top: clip.y - 26, bottom: clip.y + clip.height + layout.reach + 30 };
  const [a, b, c, d] = piece?.outline ?? [];
  return (
    <>
      <UprightDimension
        from={[clip.x - 10, clip.y]}
        to={[clip.x - 10, clip.y + clip.height]}
        text={formatInches(wedge.stripHeight)}
        {...ink}
      />
      {a && b && c && d && (
        <>
          <LevelDimension
            from={[Math.min(a[0], b[0]), ys.top]}
            to={[Math.max(a[0], b[0]), ys.top]}
            text={`${widthOf(a, b, layout.fit.scale)} in`}
            {...ink}
          />
          <LevelDimension
            from={[Math.min(c[0], d[0]), ys.bottom]}
            to={[Math.max(c[0], d[0]), ys.bottom]}
            text={`${widthOf(c, d, layout.fit.scale)} in`}
            {...ink}
          />
        </>
      )}
    </>
  );
}

const widthOf = (
  from: readonly [number, number],
  to: readonly [number, number],
  scale: number,
): string => formatExact(Math.abs(to[0] - from[0]) / scale);
