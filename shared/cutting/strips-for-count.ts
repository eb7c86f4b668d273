import { InvariantError } from '../result';

/**
 * Strips for a number of pieces: ⌈pieces ÷ pieces per strip⌉.
 *
 * @throws InvariantError when a strip yields none
 * @example stripsForCount(100, 12) // 9
 */
export function stripsForCount(pieces: number, perStrip: number): number {
  if (perStrip < 1) throw new InvariantError('a strip that yields no piece');
  return Math.ceil(pieces / perStrip);
}
