import { createKeepSoon } from '../../../sync/store/keep-soon';

beforeEach(() => jest.useFakeTimers());
afterEach(() => jest.useRealTimers());

const after = (delayMs: number, job: () => void) => {
  const timer = setTimeout(job, delayMs);
  return () => clearTimeout(timer);
};

it('saves once after a pause in the changes', () => {
  const save = jest.fn(async () => undefined);
  const { touch } = createKeepSoon(save, after);
  touch();
  jest.advanceTimersByTime(150);
  touch();
  jest.advanceTimersByTime(150);
  expect(save).toHaveBeenCalledTimes(0);
  jest.advanceTimersByTime(50);
  expect(save).toHaveBeenCalledTimes(1);
  jest.advanceTimersByTime(5000);
  expect(save).toHaveBeenCalledTimes(1);
});

it('saves at the latest a second after the first change, however fast they come', () => {
  const save = jest.fn(async () => undefined);
  const { touch } = createKeepSoon(save, after);
  for (let at = 0; at < 1000; at += 100) {
    touch();
    jest.advanceTimersByTime(100);
  }
  expect(save).toHaveBeenCalledTimes(1);
});

it('saves at once when asked, but only what is not saved yet', async () => {
  const save = jest.fn(async () => undefined);
  const { touch, flush } = createKeepSoon(save, after);
  await flush();
  expect(save).toHaveBeenCalledTimes(0);
  touch();
  await flush();
  await flush();
  expect(save).toHaveBeenCalledTimes(1);
});
