import { act, fireEvent, render, screen } from '@testing-library/react-native';

import { Stepper } from '@/components/ui/stepper';

afterEach(() => jest.useRealTimers());

it('repeats six times a second while an end is held', () => {
  jest.useFakeTimers();
  const onStep = jest.fn();
  render(<Stepper label="Blocks" value="5" onChangeText={() => undefined} onStep={onStep} />);
  const more = screen.getByLabelText('More, Blocks');
  fireEvent(more, 'longPress');
  expect(onStep).toHaveBeenCalledTimes(1);
  act(() => void jest.advanceTimersByTime(1000));
  expect(onStep).toHaveBeenCalledTimes(7);
  fireEvent(more, 'pressOut');
  act(() => void jest.advanceTimersByTime(1000));
  expect(onStep).toHaveBeenCalledTimes(7);
});
