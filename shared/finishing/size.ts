import { type Fraction } from 'fraction.js';

/** Width and height of a quilt, or of a layer of it, inches. */
export interface Size {
  width: Fraction;
  height: Fraction;
}
