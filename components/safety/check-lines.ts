import type { IconName } from '@/components/ui/icon';

export interface CheckLine {
  id: string;
  text: string;
  icon: IconName;
}

const LINES: readonly CheckLine[] = [
  { id: 'blade', text: 'Blade closed when I set it down', icon: 'lock' },
  { id: 'away', text: 'I cut away from me', icon: 'arrowUp' },
  { id: 'fingers', text: 'Fingers clear of the ruler edge', icon: 'hand' },
  { id: 'shoes', text: 'Closed shoes on', icon: 'shoes' },
  { id: 'children', text: 'Children and pets away', icon: 'paw' },
  { id: 'mat', text: 'Mat flat, nothing under it', icon: 'mat' },
  { id: 'height', text: 'Table at standing height', icon: 'height' },
];

export const ADULT_LINE: CheckLine = {
  id: 'adult',
  text: 'An adult is beside the person cutting',
  icon: 'people',
};

/** The lines to tick before cutting: seven, and the adult's when someone under 18 cuts here. */
export function checkLines(under18: boolean): readonly CheckLine[] {
  return under18 ? [...LINES, ADULT_LINE] : LINES;
}
