import { act, fireEvent, render, screen } from '@testing-library/react-native';
import { Pressable } from 'react-native';

import { ToastProvider, useToast } from '@/components/providers/toast';

const putBack = jest.fn();

function Page() {
  const { show } = useToast();
  const took = (text: string) => show({ text, action: { label: 'Put back', onPress: putBack } });
  return (
    <>
      <Pressable testID="first" onPress={() => took('Took back 5. Now 35.')} />
      <Pressable testID="second" onPress={() => took('Took back 5. Now 30.')} />
    </>
  );
}

beforeEach(() => {
  jest.useFakeTimers();
  putBack.mockClear();
  render(
    <ToastProvider>
      <Page />
    </ToastProvider>,
  );
});
afterEach(() => jest.useRealTimers());

const pass = (ms: number) => act(() => void jest.advanceTimersByTime(ms));

it('shows a toast for six seconds', () => {
  fireEvent.press(screen.getByTestId('first'));
  pass(5900);
  expect(screen.getByText('Took back 5. Now 35.')).toBeTruthy();
  pass(200);
  expect(screen.queryByTestId('toast')).toBeNull();
});

it('gives a newer toast its own six seconds', () => {
  fireEvent.press(screen.getByTestId('first'));
  pass(5000);
  fireEvent.press(screen.getByTestId('second'));
  pass(5000);
  expect(screen.getByText('Took back 5. Now 30.')).toBeTruthy();
  expect(screen.queryByText('Took back 5. Now 35.')).toBeNull();
});

it('puts back once and goes', () => {
  fireEvent.press(screen.getByTestId('first'));
  fireEvent.press(screen.getByText('Put back'));
  expect(putBack).toHaveBeenCalledTimes(1);
  expect(screen.queryByTestId('toast')).toBeNull();
});
