import { useWindowDimensions } from 'react-native';

import { breakpoint } from '@/components/ui/theme';

export interface Layout {
  kind: 'phone' | 'wide' | 'desk' | 'landscape';
  width: number;
  height: number;
}

/** A phone on its side is wider than it is high and too low for the stacked layout. */
const LOW_PX = 560;

/** Which arrangement a window of this size gets. */
export function layoutOf(width: number, height: number): Layout['kind'] {
  if (width > height && height < LOW_PX) return 'landscape';
  if (width < breakpoint.wide) return 'phone';
  return width < breakpoint.desk ? 'wide' : 'desk';
}

export function useLayout(): Layout {
  const { width, height } = useWindowDimensions();
  return { kind: layoutOf(width, height), width, height };
}
