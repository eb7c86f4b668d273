import { group } from '../group.mjs';

const FIRST = [
  'tests/shared/plan/(edges-of-limits|refusals|warnings|plan-example|five-plates|example-projects)',
];

export const PLAN = group('plan', FIRST, [
  ['canonical-json', 'PlanSchema.parse(plan)', 'plan'],
  ['check-buys', '.gte(0)', '.gt(0)'],
  ['check-fabrics', 'count > most', 'count >= most'],
  ['check-fabrics', 'index > first', 'index >= first'],
  [
    'check-geometry',
    'circle.finishedRadiusIn >= tipBeginsIn',
    'circle.finishedRadiusIn < tipBeginsIn',
  ],
  ['check-geometry', '1 + Math.tan(halfAngle(wedges))', '1 + Math.sin(halfAngle(wedges))'],
  ['check-limits', 'count > most', 'count >= most'],
  ['check-limits', 'length.gt(most)', 'length.gte(most)'],
  ['cloth-warnings', 'toFraction(spare).gte(1)', 'toFraction(spare).gt(0)'],
  ['cloth-warnings', '.floor().add(1)', '.ceil()'],
  ['cloth-warnings', 'neededAtForty <= needed', 'neededAtForty < needed'],
  ['default-request', "MARGIN = '3/4'", "MARGIN = '1/4'"],
  [
    'default-request',
    'toFraction(tipTurning).sub(narrowAt)',
    'toFraction(tipTurning).add(narrowAt)',
  ],
  ['default-request', 'Math.cos(halfAngle', 'Math.sin(halfAngle'],
  ['example-projects', "'cut', 0.5", "'cut', 0.25"],
  ['make-plan', 'sum.add(buyYards)', 'sum.sub(buyYards)'],
  ['make-plan', 'sum + countStrips(strips)', 'sum + strips.length'],
  ['make-plan', 'CAUTIOUS_WIDTH = new Fraction(40)', 'CAUTIOUS_WIDTH = new Fraction(41)'],
  ['normalise-request', 'seam: lowest(request.seam)', 'seam: request.seam'],
  ['parse-request', "? 'not-a-length' : 'not-a-request'", "? 'not-a-request' : 'not-a-length'"],
  [
    'refuse',
    'return { pointer, code, params }',
    'return { pointer: pointer.slice(1), code, params }',
  ],
  ['request-lengths', "least: '4', most: '60'", "least: '4', most: '59'"],
  ['ring-warnings', 'layers <= cutting.cap', 'layers < cutting.cap'],
  ['ring-warnings', 'wedges % order.length !== 1', 'wedges % order.length !== 2'],
  ['ring-warnings', 'wedges % 8 === 4 ? 4 : 0', 'wedges % 8 === 4 ? 0 : 4'],
]);
