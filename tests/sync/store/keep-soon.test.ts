import { createKeepSoon } from '../../../sync/store/keep-soon';

beforeEach(() => jest.useFakeTimers());
afterEach(() => jest.useRealTimers());

const after = (delayMs: number, job: () => void) => {
  const timer = setTimeout(job, delayMs);
  return () => clearTimeout(timer);
};
const makeSave = () => jest.fn(async () => undefined);
const pass = (ms: number) => jest.advanceTimersByTimeAsync(ms);

it('saves at once after the first change', () => {
  const save = makeSave();
  createKeepSoon(save, after).touch();
  expect(save).toHaveBeenCalledTimes(1);
});

it('saves again after a pause what changed meanwhile, and then rests', async () => {
  const save = makeSave();
  const { touch } = createKeepSoon(save, after);
  for (let turn = 0; turn < 5; turn += 1) touch();
  await pass(249);
  expect(save).toHaveBeenCalledTimes(1);
  await pass(1);
  expect(save).toHaveBeenCalledTimes(2);
  await pass(60_000);
  expect(save).toHaveBeenCalledTimes(2);
});

it('saves about four times a second, however fast the changes come', async () => {
  const save = makeSave();
  const { touch } = createKeepSoon(save, after);
  for (let at = 0; at < 1000; at += 20) {
    touch();
    await pass(20);
  }
  expect(save.mock.calls.length).toBeGreaterThanOrEqual(4);
  expect(save.mock.calls.length).toBeLessThanOrEqual(5);
});

it('never saves twice at a time, and saves what changed while it did', async () => {
  let end = () => {};
  const save = jest.fn(() => new Promise<void>((resolve) => (end = resolve)));
  const { touch } = createKeepSoon(save, after);
  touch();
  touch();
  await pass(10_000);
  expect(save).toHaveBeenCalledTimes(1);
  end();
  await pass(250);
  expect(save).toHaveBeenCalledTimes(2);
});

it('tries again after a failure', async () => {
  const save = makeSave();
  save.mockRejectedValueOnce(new Error('full'));
  createKeepSoon(save, after).touch();
  await pass(4999);
  expect(save).toHaveBeenCalledTimes(1);
  await pass(1);
  expect(save).toHaveBeenCalledTimes(2);
});

it('saves at once when asked, but only what is not saved yet', async () => {
  const save = makeSave();
  const { touch, flush } = createKeepSoon(save, after);
  await flush();
  expect(save).toHaveBeenCalledTimes(0);
  touch();
  await flush();
  expect(save).toHaveBeenCalledTimes(1);
  touch();
  await flush();
  await flush();
  expect(save).toHaveBeenCalledTimes(2);
});
