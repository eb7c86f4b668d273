import { isStationPath, mayOffer } from '../../../sync/client/may-offer-update';

const NOW = 10_000_000;

it('waits while counting goes on at a station', () => {
  expect(mayOffer(NOW - 59_999, NOW, true)).toBe(false);
  expect(mayOffer(NOW + 3, NOW, true)).toBe(false); // the hybrid clock is a little ahead
});

it('offers after a minute without a count', () => {
  expect(mayOffer(NOW - 60_000, NOW, true)).toBe(true);
  expect(mayOffer(null, NOW, true)).toBe(true);
});

it('offers on leaving the station, at once', () => {
  expect(mayOffer(NOW, NOW, false)).toBe(true);
});

it('is not kept away by a clock that was set back', () => {
  expect(mayOffer(NOW + 3_600_000, NOW, true)).toBe(true);
});

it.each([
  ['/projects/0199/table', true],
  ['/projects/0199/iron/', true],
  ['/projects/0199/plan', false],
  ['/projects/0199', false],
  ['/projects//table', false],
  ['/me/table', false],
])('takes %s for a station: %s', (path, expected) => {
  expect(isStationPath(path)).toBe(expected);
});
