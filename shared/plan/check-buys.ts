import { yardsToBuy } from '../cutting/yards-to-buy';
import type { PlanFabric, PlanRefusal } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { toFraction, toText } from '../units/fraction';
import { refuse } from './refuse';

/** Refuses yards that the maker set herself and that do not cover what is needed. */
export function checkBuys(request: PlanRequest, fabrics: readonly PlanFabric[]): PlanRefusal[] {
  return fabrics.flatMap(({ letter, spare, needs }) => {
    if (toFraction(spare).gte(0)) return [];
    const index = request.fabrics.findIndex((fabric) => fabric.letter === letter);
    const least = yardsToBuy(toFraction(needs), toFraction(request.cloth.shrinkPercent));
    return [refuse(`/fabrics/${index}/buyYards`, 'buys-too-little', { least: toText(least) })];
  });
}
