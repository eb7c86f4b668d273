import { lab65 } from 'culori';

import type { RequestFabric } from '../model/plan-request';

/**
 * Letters of a stack from the top: the lightest fabric first, so that a cut is seen on it. Equal
 * ones keep the order of the list.
 *
 * @param fabrics their `colour` is sRGB, #RRGGBB
 * Source: CIE L* for daylight D65, by culori.
 */
export function layerOrder(fabrics: readonly RequestFabric[]): string[] {
  return fabrics
    .map(({ letter, colour }) => ({ letter, lightness: lab65(colour)?.l ?? 0 }))
    .sort((a, b) => b.lightness - a.lightness)
    .map(({ letter }) => letter);
}
