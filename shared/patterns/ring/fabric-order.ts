import type { RequestFabric } from '../../model/plan-request';

/**
 * Letters of one round, clockwise from 12 o'clock. The dominant fabric moves to the middle of the
 * list when each quarter is one round of an odd number of fabrics: then it lies on the diagonals.
 *
 * @param fabrics the wedge fabrics, in the order of the request
 * @param wedgeCount wedges in the full ring
 */
export function fabricOrder(fabrics: readonly RequestFabric[], wedgeCount: number): string[] {
  const letters = fabrics.map(({ letter }) => letter);
  const dominant = fabrics.find((fabric) => fabric.dominant);
  if (!dominant || !dominantOnDiagonals(fabrics.length, wedgeCount)) return letters;
  const others = letters.filter((letter) => letter !== dominant.letter);
  const middle = Math.floor(letters.length / 2);
  return [...others.slice(0, middle), dominant.letter, ...others.slice(middle)];
}

/** Whether a round's middle fabric comes to lie on all four diagonals. */
export function dominantOnDiagonals(fabricCount: number, wedgeCount: number): boolean {
  return fabricCount * 4 === wedgeCount && fabricCount % 2 === 1;
}
