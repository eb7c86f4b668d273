import type { RequestFabric } from '../model/plan-request';
import { splitEvenly } from './split-evenly';

/** Fabrics that are cut together, one layer of each. */
export interface StackGroup {
  fabrics: RequestFabric[];
  oneWay: boolean;
  /** cuts through such a stack that one plate takes */
  cutsPerPlate: number;
}

/**
 * One of each: every stack holds one layer of each fabric, so that a cut yields a full round. More
 * fabrics than the cap are split as evenly as possible. One-way prints are never flipped, so they
 * are stacked apart from fabrics whose wedges tumble.
 *
 * @param fabrics the wedge fabrics, in the order of the request
 * @param letters the fabric of every wedge of one plate
 * @param depth layers at most
 */
export function stackGroups(
  fabrics: readonly RequestFabric[],
  letters: readonly string[],
  depth: number,
): StackGroup[] {
  const takes = (letter: string) => letters.filter((other) => other === letter).length;
  return [false, true].flatMap((oneWay) => {
    const alike = fabrics.filter((fabric) => fabric.oneWay === oneWay);
    return splitEvenly(alike, depth).map((group) => ({
      fabrics: group,
      oneWay,
      cutsPerPlate: Math.max(...group.map(({ letter }) => takes(letter))),
    }));
  });
}
