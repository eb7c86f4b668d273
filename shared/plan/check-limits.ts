import type { PlanRefusal } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { toFraction } from '../units/fraction';
import { checkFabrics } from './check-fabrics';
import { refuse } from './refuse';
import { requestLengths, type LengthField } from './request-lengths';

/** Sixteenths of a millimetre need far fewer digits; more would only slow the arithmetic down. */
const READABLE = /^-?\d{1,12}(\/\d{1,9})?$/;
const SHRINK_MOST = '20';
const NARROW_LEAST = '1/8';

/** Checks every field of a request by itself, and its fabrics by each other. */
export function checkLimits(request: PlanRequest): PlanRefusal[] {
  const { blocks, wedges, cutting } = request;
  return [
    ...checkCount('/blocks', blocks, 1, 200),
    ...checkCount('/wedges', wedges, 5, 60),
    ...requestLengths(request).flatMap(checkLength),
    ...checkCount('/cutting/cap', cutting.cap, 1, 16),
    ...(cutting.layers === undefined ? [] : checkCount('/cutting/layers', cutting.layers, 1, 16)),
    ...checkFabrics(request),
  ];
}

function checkCount(pointer: string, count: number, least: number, most: number): PlanRefusal[] {
  if (count < 1) return [refuse(pointer, 'not-positive')];
  if (count < least) return [refuse(pointer, 'below-least', { least })];
  return count > most ? [refuse(pointer, 'above-most', { most })] : [];
}

function checkLength({ pointer, value, positive, least, most }: LengthField): PlanRefusal[] {
  if (!READABLE.test(value)) return [refuse(pointer, 'not-a-length')];
  const length = toFraction(value);
  if (positive && length.lte(0)) return [refuse(pointer, 'not-positive')];
  if (pointer === '/narrowAt' && length.lt(NARROW_LEAST)) {
    return [refuse(pointer, 'narrow-edge-crossed', { least: NARROW_LEAST })];
  }
  if (pointer === '/cloth/shrinkPercent' && length.gt(SHRINK_MOST)) {
    return [refuse(pointer, 'shrink-too-large', { most: SHRINK_MOST })];
  }
  if (least !== undefined && length.lt(least)) return [refuse(pointer, 'below-least', { least })];
  if (most !== undefined && length.gt(most)) return [refuse(pointer, 'above-most', { most })];
  return [];
}
