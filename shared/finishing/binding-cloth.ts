import { Fraction } from 'fraction.js';

import { inchesAfterWash, yardsToBuy } from '../cutting/yards-to-buy';
import { bindingLength } from './binding-length';
import { bindingStrips } from './binding-strips';
import { bindingStripsUnjoined } from './binding-strips-unjoined';
import { joinedStrips } from './joined-strips';
import type { Size } from './size';

/** Cloth for a binding cut across the width. Lengths in inches. */
export interface BindingCloth {
  length: Fraction;
  strips: number;
  /** what the short rule says; it differs where joins matter */
  unjoined: number;
  /** binding left over when all strips are joined */
  bindingLeft: Fraction;
  needs: Fraction;
  buyYards: Fraction;
  /** cloth left over of what is bought */
  spare: Fraction;
}

const UNWASHED = new Fraction(0);

/**
 * Cloth for a straight binding with diagonal joins.
 *
 * @param quilt finished size, inches
 * @param width cut width of the strips, inches
 * @param usableWidth U of the cloth, inches
 */
export function bindingCloth(quilt: Size, width: Fraction, usableWidth: Fraction): BindingCloth {
  const length = bindingLength(quilt);
  const strips = bindingStrips(length, usableWidth, width);
  const needs = width.mul(strips);
  const buyYards = yardsToBuy(needs, UNWASHED);
  return {
    length,
    strips,
    unjoined: bindingStripsUnjoined(length, usableWidth),
    bindingLeft: joinedStrips(strips, usableWidth, width).sub(length),
    needs,
    buyYards,
    spare: inchesAfterWash(buyYards, UNWASHED).sub(needs),
  };
}
