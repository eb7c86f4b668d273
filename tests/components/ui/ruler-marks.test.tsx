import { rulerMarks } from '@/components/ui/ruler-marks';
import { tallySize } from '@/components/ui/tally-number';
import { layoutOf } from '@/components/ui/use-layout';

it('draws a tick a cut and a numbered long one a stack', () => {
  const marks = rulerMarks(100, 5, 20);
  expect(marks).toHaveLength(21);
  expect(marks.filter(({ long }) => long).map(({ label }) => label)).toEqual(
    ['0', '20', '40', '60', '80', '100'], //
  );
});

it('thins ticks and numbers out before they run together', () => {
  const marks = rulerMarks(1000, 5, 20);
  expect(marks.length).toBeLessThanOrEqual(9);
  expect(marks[0]?.label).toBe('0');
  expect(marks.at(-1)?.label).toBe('1000');
});

it('leaves out a number that would touch the last one', () => {
  const numbers = rulerMarks(41, 1, 20).map(({ label }) => label);
  expect(numbers.filter((label) => label !== null)).toEqual(['0', '20', '41']);
});

it('draws nothing for a target of nothing', () => {
  expect(rulerMarks(0, 1)).toEqual([]);
});

it('sizes the tally by its digits and its zone, never under 96', () => {
  expect(tallySize(2, false, 380, 358)).toBe(168);
  expect(tallySize(3, false, 380, 358)).toBe(140);
  expect(tallySize(4, false, 380, 358)).toBe(104);
  expect(tallySize(2, true, 340, 700)).toBe(212);
  expect(tallySize(2, false, 380, 240)).toBe(120);
  expect(tallySize(4, false, 200, 120)).toBe(96);
});

it('tells a phone, a phone on its side, a wide and a desk screen apart', () => {
  expect(layoutOf(390, 844)).toBe('phone');
  expect(layoutOf(844, 390)).toBe('landscape');
  expect(layoutOf(932, 430)).toBe('landscape');
  expect(layoutOf(1024, 768)).toBe('wide');
  expect(layoutOf(1280, 800)).toBe('desk');
});
