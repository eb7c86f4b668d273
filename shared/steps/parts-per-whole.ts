import { InvariantError } from '../result';
import type { PlanLane } from '../model/plan';

/**
 * The least number of equal parts in which every use of a part of a strip or a stack is whole, so
 * that the piece flow counts in whole parts: exact, and quick enough for every tap.
 *
 * @example partsPerWhole([{ consumes: { 'strip:A': '1/3' }, … }]) // 3
 */
export function partsPerWhole(lanes: readonly Pick<PlanLane, 'consumes'>[]): number {
  let parts = 1;
  for (const { consumes } of lanes) {
    for (const used of Object.values(consumes)) {
      const [, denominator] = splitFraction(used);
      parts = (parts / greatestCommon(parts, denominator)) * denominator;
    }
  }
  return parts;
}

/** An amount in such parts. @example inParts('2/3', 6) // 4 */
export function inParts(amount: number | string, parts: number): number {
  const [numerator, denominator] = splitFraction(amount);
  return (numerator * parts) / denominator;
}

function splitFraction(amount: number | string): [number, number] {
  if (typeof amount === 'number') return [amount, 1];
  const [numerator, denominator = '1'] = amount.split('/');
  const pair: [number, number] = [Number(numerator), Number(denominator)];
  if (!pair.every(Number.isSafeInteger)) throw new InvariantError(`no fraction: ${amount}`);
  return pair;
}

function greatestCommon(a: number, b: number): number {
  return b === 0 ? a : greatestCommon(b, a % b);
}
