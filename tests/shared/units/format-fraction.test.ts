import {
  formatExact,
  formatFraction,
  formatInches,
  formatYards,
} from '../../../shared/units/format-fraction';

describe('formatFraction', () => {
  it.each([
    ['17/4', '4¼'],
    ['13/8', '1⅝'],
    ['13/16', '13⁄16'],
    ['19/16', '1 3⁄16'],
    ['12', '12'],
    ['0', '0'],
    ['-1/2', '−½'],
    ['7/3', '2⅓'],
  ])('writes %s as %s', (value, text) => {
    expect(formatFraction(value)).toBe(text);
  });

  it('adds the unit', () => {
    expect(formatInches('17/4')).toBe('4¼ in');
    expect(formatYards('3/8')).toBe('⅜ yd');
  });
});

describe('formatExact', () => {
  it('keeps two decimals, or as many as asked for', () => {
    expect(formatExact(0.981386)).toBe('0.98');
    expect(formatExact(-0.981386, 3)).toBe('−0.981');
  });
});
