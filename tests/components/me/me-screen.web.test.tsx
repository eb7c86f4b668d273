import AsyncStorage from '@react-native-async-storage/async-storage';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';

import { MeScreen } from '@/components/me/me-screen';
import { serverText, storageText } from '@/components/me/device-texts';
import { saveFile } from '@/components/ui/save-file';
import { fetchServerHealth } from '@/sync/client/api/server-health';
import { projects } from '@/sync/client/projects';

import type { FakeProjectsClient } from '../projects/fake-projects-client';
import { byId, named, openPage, seek, text, typeInto } from '../projects/page';
import { click, type Mounted } from '../ui/mount-web';

jest.setTimeout(60_000);
jest.mock('expo-router', () => require('../station/station-router').stationRouter);
jest.mock('@/components/ui/save-file', () => ({ saveFile: jest.fn(async () => undefined) }));
jest.mock('@/sync/client/api/server-health', () => ({ fetchServerHealth: jest.fn() }));
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('../projects/fake-projects-client');
  return { projects: new Fake() };
});
const store = projects as unknown as FakeProjectsClient;
const health = jest.mocked(fetchServerHealth);

let page: Mounted;
let queries: QueryClient;
const open = async () => {
  queries = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  page = await openPage(
    <QueryClientProvider client={queries}>
      <MeScreen />
    </QueryClientProvider>,
  );
};
const keptSettings = async () =>
  JSON.parse((await AsyncStorage.getItem('matside.settings')) ?? '{}') as Record<string, unknown>;

beforeEach(async () => {
  store.reset();
  await AsyncStorage.clear();
  health.mockReset();
  health.mockResolvedValue({ status: 'ok', version: '1' });
});
afterEach(async () => {
  await page.unmount();
  queries.clear();
});

it('keeps the theme, the hand and what is heard', async () => {
  await open();
  await click(named('Lamp'));
  await click(byId('left-handed'));
  await click(byId('click'));
  await click(byId('under-18'));
  expect(await keptSettings()).toMatchObject({
    theme: 'lamp',
    leftHanded: true,
    click: true,
    under18: true,
    spokenCount: false,
  });
});

it('takes the cautious layers of the blade until she sets her own', async () => {
  await open();
  await click(named('60 mm'));
  expect(text()).toContain('Otherwise 6 with a 60 mm blade');
  await click(byId('own-cap'));
  expect(await keptSettings()).toMatchObject({ bladeMm: 60, cap: 6 });
  await typeInto('cap', '8');
  expect(await keptSettings()).toMatchObject({ cap: 8 });
  expect(text()).toContain('Above the cautious 6. Cuts grow less accurate as the stack rises.');
  await typeInto('cap', '40');
  expect(text()).toContain('Use 1 to 16.');
  expect(await keptSettings()).toMatchObject({ cap: 8 });
});

it('opens the example, and takes it away after asking', async () => {
  await open();
  await click(byId('open-example'));
  expect(store.snapshot().projects).toHaveLength(3);
  await click(byId('remove-example'));
  expect(store.snapshot().projects).toHaveLength(3);
  await click(byId('remove-example-yes'));
  expect(store.snapshot().projects).toHaveLength(0);
});

it('saves a copy of everything as JSON', async () => {
  await open();
  await click(byId('save-copy'));
  expect(saveFile).toHaveBeenCalledWith(
    'matside-copy.json',
    expect.stringContaining('"kind":"backup"'),
    'application/json',
  );
});

it('says where counts are kept and that the server answers', async () => {
  await open();
  expect(byId('fact-storage').textContent).toBe('On this device, kept for good');
  expect(byId('fact-durability').textContent).toBe('wal exclusive 2');
  expect(byId('fact-server').textContent).toBe('Answers');
});

it('stays calm and whole without a server', async () => {
  health.mockRejectedValue(new TypeError('no network'));
  await open();
  expect(byId('fact-server').textContent).toContain('Everything here works without it.');
  expect(seek('save-copy')).not.toBeNull();
});

it('shows the settings while projects are opening, and when they did not open', async () => {
  store.startUp();
  await open();
  expect(seek('theme')).not.toBeNull();
  expect(seek('open-example')).toBeNull();
  await page.unmount();
  store.fail({ kind: 'failed', detail: 'broken' });
  await open();
  expect(text()).toContain('Your projects did not open');
  expect(seek('theme')).not.toBeNull();
});

it('words every state of storage and network', () => {
  const status = { ...store.snapshot().status };
  expect(storageText({ ...status, storage: 'memory' })).toContain('This browser only');
  expect(storageText({ ...status, persisted: false })).toContain('not promised to stay');
  expect(storageText({ ...status, role: 'follower' })).toContain('through another tab');
  expect(serverText('pending', 'paused')).toContain('No network');
  expect(serverText('pending', 'fetching')).toBe('Asking');
});
