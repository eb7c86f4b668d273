import { readFraction, splitFractions } from '@/components/ui/split-fractions';

it('leaves a text without fractions, and one with a quarter, as it is', () => {
  expect(splitFractions('Cut 4 wedges')).toEqual([{ kind: 'text', text: 'Cut 4 wedges' }]);
  expect(splitFractions('4¼ in')).toEqual([{ kind: 'text', text: '4¼ in' }]);
});

it('takes an eighth out of its text', () => {
  expect(splitFractions('Buy ⅞ yd')).toEqual([
    { kind: 'text', text: 'Buy ' },
    { kind: 'fraction', over: '7', under: '8', mixed: false },
    { kind: 'text', text: ' yd' },
  ]);
});

it('knows that a whole number stands before the fraction', () => {
  expect(splitFractions('1⅝ yd')[1]).toEqual({
    kind: 'fraction',
    over: '5',
    under: '8',
    mixed: true,
  });
  expect(splitFractions('1 3⁄16 in')).toEqual([
    { kind: 'text', text: '1' },
    { kind: 'fraction', over: '3', under: '16', mixed: true },
    { kind: 'text', text: ' in' },
  ]);
});

it('takes every fraction of a line', () => {
  const fractions = splitFractions('⅛ yd and 13⁄32 in').filter(({ kind }) => kind === 'fraction');
  expect(fractions).toHaveLength(2);
});

it('reads fractions out in words', () => {
  expect(readFraction('5', '8', false)).toBe('5 eighths');
  expect(readFraction('5', '8', true)).toBe('and 5 eighths');
  expect(readFraction('1', '16', false)).toBe('1 sixteenth');
  expect(readFraction('3', '7', false)).toBe('3 over 7');
});
