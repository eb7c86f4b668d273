import { InvariantError } from '../result';

/**
 * Splits things into groups of at most `cap`, as few and as even as possible, larger ones first.
 *
 * @throws InvariantError when cap < 1
 * @example splitEvenly(['A', 'B', 'C', 'D', 'E'], 4) // [['A', 'B', 'C'], ['D', 'E']]
 */
export function splitEvenly<T>(things: readonly T[], cap: number): T[][] {
  if (cap < 1) throw new InvariantError('a stack has one layer or more');
  const groups = Math.ceil(things.length / cap);
  const smallest = Math.floor(things.length / groups);
  const larger = things.length % groups;
  return Array.from({ length: groups }, (_, index) => {
    const start = index * smallest + Math.min(index, larger);
    return things.slice(start, start + smallest + (index < larger ? 1 : 0));
  });
}
