import { wcagContrast } from 'culori';

import { type ColorRole, day, lamp } from '@/components/ui/colors';
import { themeOf } from '@/components/ui/theme';

const DYES = ['indigo', 'madder', 'weld', 'moss', 'woad'] as const;
const TEXT = 4.5;
const CONTROL = 3;
type Pair = [over: ColorRole, under: ColorRole, least: number];

const PAIRS: Pair[] = [
  ...(['paper', 'card', 'sunk'] as const).flatMap((under): Pair[] => [
    ['ink', under, TEXT],
    ['ink2', under, TEXT],
    ['edge', under, CONTROL],
  ]),
  ['paper', 'ink', TEXT],
  ['onAction', 'action', TEXT],
  ['action', 'paper', CONTROL],
  ['action', 'card', CONTROL],
  ['focus', 'paper', CONTROL],
  ['focus', 'card', CONTROL],
  ['focusGap', 'ink', CONTROL],
  ...DYES.flatMap((dye): Pair[] => {
    const on = `on${dye[0]?.toUpperCase()}${dye.slice(1)}` as ColorRole;
    return [
      [on, dye, TEXT],
      [`${dye}Ink`, 'paper', TEXT],
      [`${dye}Ink`, 'card', TEXT],
      [`${dye}Ink`, `${dye}Tint`, TEXT],
      ['ink', `${dye}Tint`, TEXT],
      ['ink2', `${dye}Tint`, TEXT],
    ];
  }),
];

describe.each([
  ['Day', day],
  ['Lamp', lamp],
])('the colours of %s', (_name, color) => {
  it.each(PAIRS)('let %s be read on %s at %d to 1 or more', (over, under, least) => {
    expect(wcagContrast(color[over], color[under])).toBeGreaterThanOrEqual(least);
  });
});

// figures of the look's own table, computed there from the same hex values by another program
it.each([
  [day.ink, day.paper, 13.71],
  [day.ink2, day.sunk, 6.24],
  [day.edge, day.sunk, 3.51],
  [day.onWoad, day.woad, 5.97],
  [lamp.ink, lamp.paper, 15.52],
  [lamp.edge, lamp.card, 4.5],
  [lamp.onWoad, lamp.woad, 7.1],
])('%s on %s keeps the contrast %d that the look promises', (over, under, ratio) => {
  expect(wcagContrast(over, under)).toBeCloseTo(ratio, 2);
});

it('outlines every station zone in a colour that stands out from paper', () => {
  for (const name of ['day', 'lamp'] as const) {
    const theme = themeOf(name);
    for (const station of ['table', 'machine', 'iron', 'chair', 'wall'] as const) {
      expect(wcagContrast(theme.station(station).ink, theme.color.paper)).toBeGreaterThanOrEqual(3);
    }
  }
});
