import { useId } from 'react';
import { ClipPath, Defs, G, Rect } from 'react-native-svg';

import { Badge, LaterCut, Piece } from '@/components/diagrams/parts/marks';
import { DARK, HALO, type FabricPaint, type Paints } from '@/components/diagrams/parts/paints';
import { RulerAndCut } from '@/components/diagrams/parts/ruler';
import { cornersOf, type StripLayout } from '@/shared/geometry/drawing/strip-layout';
import type { Point } from '@/shared/geometry/drawing/points';

interface Props {
  layout: StripLayout;
  paint: FabricPaint;
  paints: Paints;
  leftHanded: boolean;
  /** how far above its cut line's lower end the arrow stands, for cloth that runs off the picture */
  lift?: number;
  /** where the numbers stand, pixels from the top; the middle when left out */
  badgesAt?: number;
  /** parts done before the first one drawn */
  before?: number;
}

/** Cloth under the ruler: parts done, the one to cut now, later ones. */
export function CutsDrawing({
  layout,
  paint,
  paints,
  leftHanded,
  lift = 0,
  badgesAt,
  before = 0,
}: Props) {
  const { clip, cloth, parts, scale } = layout;
  const clipId = `clip-${useId().replace(/\W/g, '')}`;
  const next = parts.find(({ state }) => state === 'next');
  const halo = paint.dark;
  return (
    <>
      <Defs>
        <ClipPath id={clipId}>
          <Rect x={clip.x - 14} y={0} width={clip.width + 28} height={clip.y + clip.height + 40} />
        </ClipPath>
      </Defs>
      <G clipPath={`url(#${clipId})`}>
        <Rect {...cloth} fill={paint.right} stroke={paints.outline} strokeWidth={1} />
        {parts.map(({ box, cut, index, state }) =>
          state === 'later' ? (
            <LaterCut key={index} points={cut} color={paint.ink} />
          ) : (
            <Piece
              key={index}
              points={cornersOf(box)}
              fill={HALO}
              opacity={state === 'next' ? 0.55 : 0}
              line={state === 'next' ? DARK : paint.ink}
              width={state === 'next' ? 2.5 : 1.3}
            />
          ),
        )}
        {next && (
          <RulerAndCut
            paints={paints}
            cut={lifted(next.cut, lift)}
            scale={scale}
            width={Math.min(40, Math.max(14, scale * 1.15))}
            side={leftHanded ? 1 : -1}
            halo={halo}
            overhang={8}
          />
        )}
        {parts.map(({ box, index, state }) => (
          <Badge
            key={index}
            at={[box.x + box.width / 2, badgesAt ?? box.y + box.height / 2]}
            text={String(before + index + 1)}
            state={state}
            radius={Math.max(8, Math.min(13, box.width * 0.36))}
          />
        ))}
      </G>
    </>
  );
}

const lifted = ([near, far]: [Point, Point], by: number): [Point, Point] => [
  [near[0], near[1] - by],
  far,
];
