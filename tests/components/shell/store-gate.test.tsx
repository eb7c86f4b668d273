import { act, fireEvent, render, screen, waitFor } from '@testing-library/react-native';
import { Text } from 'react-native';

import { StoreGate } from '@/components/shell/store-gate';
import { saveFile } from '@/components/ui/save-file';
import { SavedChip } from '@/components/ui/saved-chip';
import type { StoreFailure } from '@/sync/client/projects-client';

import { projects } from './fake-projects';

jest.mock('@/sync/client/projects', () => require('./fake-projects'));
jest.mock('@/components/ui/save-file', () => ({ saveFile: jest.fn(async () => undefined) }));

const gate = () =>
  render(
    <StoreGate>
      <Text>the page</Text>
    </StoreGate>,
  );

afterEach(() => {
  jest.useRealTimers();
  act(() => projects.stand({}));
});

it('shows the page once the store is open', () => {
  gate();
  expect(screen.getByText('the page')).toBeTruthy();
  expect(screen.queryByText('Save a copy')).toBeNull();
});

it('shows blocks while the store opens, and only when it takes longer than 0.3 s', () => {
  jest.useFakeTimers();
  projects.stand({ phase: 'starting' });
  gate();
  expect(screen.queryByText('Opening your projects')).toBeNull();
  act(() => void jest.advanceTimersByTime(310));
  expect(screen.getByText('Opening your projects')).toBeTruthy();
  act(() => projects.stand({ phase: 'ready' }));
  expect(screen.getByText('the page')).toBeTruthy();
});

it.each<[StoreFailure, string, boolean]>([
  [{ kind: 'open-elsewhere' }, 'Open in another tab', false],
  [{ kind: 'newer-schema' }, 'This page is an older Matside', false],
  [{ kind: 'storage-full' }, 'This device is full', true],
  [{ kind: 'failed', detail: 'disk I/O error' }, 'Your projects did not open', true],
])('says what is kept and what to do after %j', (failure, title, copy) => {
  projects.stand({ phase: 'failed', failure });
  gate();
  expect(screen.getByText(title)).toBeTruthy();
  expect(screen.queryByText('the page')).toBeNull();
  expect(screen.queryByText('Save a copy') !== null).toBe(copy);
  const before = projects.started;
  fireEvent.press(screen.getByTestId('try-again'));
  expect(projects.started).toBe(before + 1);
});

it('tells what went wrong only to whoever asks', () => {
  projects.stand({ phase: 'failed', failure: { kind: 'failed', detail: 'disk I/O error' } });
  gate();
  expect(screen.queryByText('disk I/O error')).toBeNull();
  fireEvent.press(screen.getByText('What went wrong'));
  expect(screen.getByText('disk I/O error')).toBeTruthy();
});

it('warns calmly where the browser keeps nothing, and saves a copy', async () => {
  projects.stand({ storage: 'memory' });
  gate();
  expect(screen.getByText('the page')).toBeTruthy();
  expect(screen.getByText(/This browser gives no lasting storage\./)).toBeTruthy();
  fireEvent.press(screen.getByText('Save a copy'));
  await waitFor(() =>
    expect(saveFile).toHaveBeenCalledWith(
      'matside-copy.json',
      '{"kind":"backup"}',
      'application/json',
    ),
  );
});

it('says so when the browser may clear what is kept', () => {
  projects.stand({ persisted: false });
  gate();
  expect(screen.getByText(/The browser may clear it when room runs short\./)).toBeTruthy();
});

it.each([
  [{}, 'Saved on this device'],
  [{ phase: 'starting' }, 'Opening'],
  [{ storage: 'memory' }, 'Kept in this browser only'],
  [{ phase: 'failed', failure: { kind: 'storage-full' } }, 'Not saved'],
] as const)('the chip of %j says %s', (status, words) => {
  projects.stand(status);
  render(<SavedChip />);
  expect(screen.getByText(words)).toBeTruthy();
});
