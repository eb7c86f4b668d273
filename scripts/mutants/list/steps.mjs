import { group } from '../group.mjs';

const FIRST = ['tests/shared/steps', 'tests/shared/(outside|plan/plan-example)'];

export const STEPS = group('steps', FIRST, [
  ['count-outrun', 'addAmount(pool, item, -parts)', 'addAmount(pool, item, parts)'],
  ['count-outrun', 'each * done - Math.max', 'each * done + Math.max'],
  ['cutting-steps', 'each * (lengths - 1) + lastEach', 'each * lengths + lastEach'],
  ['cutting-steps', '`1/${count}`', '`1/${count + 1}`'],
  ['finish-steps', 'position: index + 1', 'position: index'],
  ['finish-steps', 'lane.target * madePerTap(lane)', 'lane.target'],
  ['finishing-steps', "CIRCLE_MM = '9/5'", "CIRCLE_MM = '21/10'"],
  ['finishing-steps', 'toFraction(trim).div(2)', 'toFraction(trim).div(4)'],
  ['joining-steps', '(counts[item] ?? 0) + 1', '(counts[item] ?? 0) + 2'],
  ['joining-steps', '(known?.target ?? 0) + blocks', '(known?.target ?? 0) + 1'],
  [
    'parts-per-whole',
    'greatestCommon(parts, denominator)) * denominator',
    'greatestCommon(parts, denominator))',
  ],
  ['parts-per-whole', '(numerator * parts) / denominator', '(numerator * denominator) / parts'],
  ['piece-name', '${narrowAt} ${stripHeight} ${seam}', '${narrowAt} ${seam} ${stripHeight}'],
  ['possible-taps', 'Math.min(...taps)', 'Math.max(...taps)'],
  ['possible-taps', 'Math.floor', 'Math.ceil'],
  ['read-items', "countOf('done') - countOf('unpicked')", "countOf('done') + countOf('unpicked')"],
  [
    'read-items',
    'addAmount(items.used, item, each * done)',
    'addAmount(items.used, item, each + done)',
  ],
  ['read-needs', 'Math.ceil(asked / parts) * parts', 'Math.floor(asked / parts) * parts'],
  ['read-needs', 'amountOf(askedFor, item) - amountOf(spare, item)', 'amountOf(askedFor, item)'],
  ['read-progress', 'made - lost)', 'made + lost)'],
  ['read-progress', '- amountOf(lost, item) -', '+ amountOf(lost, item) -'],
  ['read-ready', 'toGo - sum(left) / parts', 'toGo + sum(left) / parts'],
  ['read-ready', 'Math.min(wanted,', 'Math.max(wanted,'],
  ['recut-lane', 'target: pieces', 'target: pieces + 1'],
  ['step-draft', '{ [made]: 1 }', '{ [made]: 2 }'],
  ['tip-steps', 'wedges * blocks', 'wedges + blocks'],
  ['tip-steps', "TRIMMED_TO = '1/8'", "TRIMMED_TO = '1/4'"],
]);
