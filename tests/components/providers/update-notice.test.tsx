import { act, fireEvent, render, screen } from '@testing-library/react-native';

import { UpdateNotice } from '@/components/providers/update-notice';

const mockUpdate = {
  apply: jest.fn(),
  found: (_apply: () => void) => undefined as void,
  may: true,
};
jest.mock('@/sync/client/app-update', () => ({
  watchForUpdate: (found: (apply: () => void) => void) => {
    mockUpdate.found = found;
  },
  mayOfferUpdate: () => mockUpdate.may,
}));

beforeEach(() => {
  jest.useFakeTimers();
  mockUpdate.apply.mockClear();
  mockUpdate.may = true;
  render(<UpdateNotice />);
});
afterEach(() => jest.useRealTimers());

const find = () => act(() => mockUpdate.found(mockUpdate.apply));
const pass = (ms: number) => act(() => void jest.advanceTimersByTime(ms));

it('says nothing while there is no update', () => {
  pass(60_000);
  expect(screen.queryByTestId('update')).toBeNull();
});

it('offers an update in a pause and applies it only when asked', () => {
  find();
  expect(mockUpdate.apply).not.toHaveBeenCalled();
  fireEvent.press(screen.getByTestId('update'));
  expect(mockUpdate.apply).toHaveBeenCalledTimes(1);
});

it('never interrupts a count: it waits until the pause', () => {
  mockUpdate.may = false;
  find();
  pass(60_000);
  expect(screen.queryByTestId('update')).toBeNull();
  mockUpdate.may = true;
  pass(5000);
  expect(screen.getByTestId('update')).toBeTruthy();
});

it('goes away again when counting goes on', () => {
  find();
  mockUpdate.may = false;
  pass(5000);
  expect(screen.queryByTestId('update')).toBeNull();
});

it('keeps quiet for half an hour after "Later"', () => {
  find();
  fireEvent.press(screen.getByTestId('update-later'));
  pass(29 * 60_000);
  expect(screen.queryByTestId('update')).toBeNull();
  pass(2 * 60_000);
  expect(screen.getByTestId('update')).toBeTruthy();
});
