import { Fraction } from 'fraction.js';

import { yardsToBuy } from '../cutting/yards-to-buy';
import type { Size } from './size';

/** A backing pieced from widths of cloth. Lengths in inches. */
export interface BackingPanels {
  panels: number;
  /** length of each panel along the cloth */
  each: Fraction;
  needs: Fraction;
  buyYards: Fraction;
}

/** Half an inch off both edges: the selvedges go into the seam. */
const LOST_PER_JOIN = 1;
const UNWASHED = new Fraction(0);

/**
 * Panels of cloth joined into a backing, with upright or level joins.
 *
 * @param backing its whole size, overhang included, inches
 * @param usableWidth U of the cloth, inches; n panels span nU − (n − 1)
 * @param run `upright`: panels run from top to bottom; `level`: from side to side
 */
export function backingPanels(
  backing: Size,
  usableWidth: Fraction,
  run: 'upright' | 'level',
): BackingPanels {
  const [across, each] =
    run === 'upright' ? [backing.width, backing.height] : [backing.height, backing.width];
  const panels = across.sub(LOST_PER_JOIN).div(usableWidth.sub(LOST_PER_JOIN)).ceil();
  const needs = each.mul(panels);
  return { panels: Number(panels.n), each, needs, buyYards: yardsToBuy(needs, UNWASHED) };
}
