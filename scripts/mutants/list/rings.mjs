import { group } from '../group.mjs';

const ORDER = [
  'tests/shared/patterns',
  'tests/shared/plan/(plan-example|five-plates)',
  'tests/shared/outside',
];
const PATTERNS = group('patterns/ring', ORDER, [
  ['fabric-order', 'Math.floor(letters.length / 2)', 'Math.floor(letters.length / 4)'],
  ['fabric-order', 'fabricCount * 4 === wedgeCount', 'fabricCount * 2 === wedgeCount'],
  ['plan-geometry', 'usableIn - stripRun', 'usableIn + stripRun'],
  ['plan-geometry', 'narrowAt.add(stripHeight)', 'narrowAt.sub(stripHeight)'],
  ['plan-geometry', 'wedges % 4 === 0', 'wedges % 2 === 1'],
  ['ring-cutting', 'perPlate: group.cutsPerPlate', 'perPlate: group.cutsPerPlate + 1'],
  ['ring-geometry', '2 * cutHalf(narrowAt)', 'cutHalf(narrowAt)'],
  ['ring-geometry', 'block.div(2).sub(reach)', 'block.div(4).sub(reach)'],
  ['ring-geometry', "centre.shape === 'circle' ? 0", "centre.shape === 'circle' ? 0.25"],
  ['ring-letters', 'letters.at(-2)', 'letters.at(-1)'],
  ['ring-letters', 'j % order.length', '(j + 1) % order.length'],
  [
    'ring-strips',
    "squareStrips('circle', geometry.circle.square",
    "squareStrips('circle', geometry.circle.cut",
  ],
  ['ring-units', 'Math.ceil(letters.length / 2)', 'Math.floor(letters.length / 2)'],
  ['ring-units', 'pairs % 2 === 0', 'pairs % 2 === 1'],
  ['unit-item', '.size === 1', '.size === 2'],
]);

const STACKS = group(
  'stacks',
  ['tests/shared/stacks', 'tests/shared/plan/five-plates'],
  [
    ['default-cap', '45: 4', '45: 5'],
    ['layer-order', 'b.lightness - a.lightness', 'a.lightness - b.lightness'],
    ['plan-stacks', 'count * cutsEach * layers.length', 'count * cutsEach'],
    ['plan-stacks', 'cut.lengths - 1', 'cut.lengths'],
    ['split-evenly', 'Math.min(index, larger)', 'Math.max(index, larger)'],
    ['split-evenly', 'Math.ceil(things.length / cap)', 'Math.floor(things.length / cap)'],
    ['stack-groups', 'Math.max(...group', 'Math.min(...group'],
  ],
);

export const RINGS = [...PATTERNS, ...STACKS];
