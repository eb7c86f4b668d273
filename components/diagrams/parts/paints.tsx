import { useId, useMemo } from 'react';
import { Defs } from 'react-native-svg';

import { clothOf, ClothPattern } from '@/components/ui/cloth';
import { type Theme, useTheme } from '@/components/ui/theme';
import { isDarkCloth, wrongSide } from '@/shared/geometry/drawing/cloth-colours';
import type { RequestFabric } from '@/shared/model/plan-request';

/** What one fabric is painted with in one drawing. */
export interface FabricPaint {
  letter: string;
  cloth: string;
  /** the right side: the print */
  right: string;
  /** the wrong side: paler, no print */
  wrong: string;
  /** letters, and lines lying on the cloth */
  ink: string;
  dark: boolean;
}

/** Light for halos and badges on cloth, the same by day and by lamp: the cloth does not change. */
export const HALO = '#FFFAF0';
export const DARK = '#2A2017';

export interface Paints {
  id: string;
  theme: Theme;
  fabrics: readonly RequestFabric[];
  outline: string;
  seam: string;
  cut: string;
  of(letter: string): FabricPaint;
}

function paintOf(fabric: RequestFabric, id: string): FabricPaint {
  const { cloth, letter } = clothOf(fabric);
  return {
    letter: fabric.letter,
    cloth,
    right: `url(#${id}-${fabric.letter})`,
    wrong: wrongSide(cloth),
    ink: letter,
    dark: isDarkCloth(cloth),
  };
}

/** Paints for the fabrics of a drawing; their patterns go into its `PaintDefs`. */
export function usePaints(fabrics: readonly RequestFabric[]): Paints {
  const theme = useTheme();
  const id = `cloth-${useId().replace(/\W/g, '')}`;
  return useMemo(() => {
    const plain: FabricPaint = {
      letter: '',
      cloth: theme.color.sunk,
      right: theme.color.sunk,
      wrong: theme.color.sunk,
      ink: theme.color.ink,
      dark: false,
    };
    const paints = new Map(fabrics.map((fabric) => [fabric.letter, paintOf(fabric, id)]));
    return {
      id,
      theme,
      fabrics,
      outline: theme.diagram.outline,
      seam: theme.diagram.seam,
      cut: theme.diagram.cutLine,
      of: (letter) => paints.get(letter) ?? plain,
    };
  }, [fabrics, id, theme]);
}

export function PaintDefs({ paints, scale = 1 }: { paints: Paints; scale?: number }) {
  return (
    <Defs>
      {paints.fabrics.map((fabric) => (
        <ClothPattern
          key={fabric.letter}
          id={`${paints.id}-${fabric.letter}`}
          fabric={fabric}
          scale={scale}
        />
      ))}
    </Defs>
  );
}
