import AsyncStorage from '@react-native-async-storage/async-storage';

import { checkLines } from '@/components/safety/check-lines';
import { SafetyScreen } from '@/components/safety/safety-screen';

import { ringRequest } from '../projects/fake-projects-client';
import { byId, openPage, seek, text } from '../projects/page';
import {
  createProject,
  fill,
  holdTime,
  kept,
  openStation,
  pressKey,
} from '../station/station-support';
import { click, type Mounted } from '../ui/mount-web';

jest.setTimeout(60_000);
jest.mock('expo-router', () => require('../station/station-router').stationRouter);
jest.mock('@/sync/client/projects', () => require('../station/counting-store'));
jest.mock('expo-keep-awake', () => ({
  activateKeepAwakeAsync: async () => undefined,
  deactivateKeepAwake: async () => undefined,
}));

let page: Mounted;
let id = '';

beforeEach(async () => {
  holdTime();
  await AsyncStorage.clear();
  id = await createProject(ringRequest());
  for (const role of ['strip', 'length', 'stack']) await fill(id, role);
});
afterEach(async () => {
  await page.unmount();
  jest.restoreAllMocks();
});

const openCut = async () => {
  page = await openStation(id, 'table', 'cut');
};
const tickAll = async (under18: boolean) => {
  for (const line of checkLines(under18)) await click(byId(`check-${line.id}`));
};

it('stands before the cuts until all seven are ticked', async () => {
  await openCut();
  expect(text()).toContain('Before you cut');
  expect(seek('tally')).toBeNull();
  await click(byId('check-start'));
  expect(text()).toContain('7 checks to go');
  await tickAll(false);
  expect(text()).toContain('7 of 7');
  await click(byId('check-start'));
  expect(seek('safety-check')).toBeNull();
  expect(seek('tally')).not.toBeNull();
});

it('never blocks a key or pedal, which counts and ticks nothing', async () => {
  await openCut();
  await pressKey(' ');
  await pressKey('Enter', byId('check-blade'));
  await pressKey('PageDown');
  expect(kept(id, 'cut', 'done')).toBe(3);
  expect(byId('check-count').textContent).toContain('15 of 100 pieces cut');
  expect(text()).toContain('0 of 7');
});

it('lets her skip once by a tap, and remembers it when the page opens again', async () => {
  await openCut();
  await click(byId('check-skip'));
  expect(seek('tally')).not.toBeNull();
  await page.unmount();
  await openCut();
  expect(seek('safety-check')).toBeNull();
});

it('asks for the adult, and offers no skip, when someone under 18 cuts here', async () => {
  await AsyncStorage.setItem('matside.settings', JSON.stringify({ under18: true }));
  await openCut();
  expect(text()).toContain('8 checks');
  expect(seek('check-skip')).toBeNull();
  await tickAll(false);
  expect(text()).toContain('1 check to go');
});

it('holds the rest of the cautions behind More', async () => {
  await openCut();
  expect(text()).not.toContain('Never catch a falling cutter');
  await click(byId('check-more'));
  expect(text()).toContain('Never catch a falling cutter');
  expect(text()).toContain('not medical or legal advice');
});

it('does not stand before steps that cut nothing', async () => {
  page = await openStation(id, 'machine', 'pair');
  expect(seek('safety-check')).toBeNull();
});

it('never calls anything safe', async () => {
  page = await openPage(<SafetyScreen />);
  expect(text()).not.toMatch(/\bis safe\b|\bsafely\b|\bsafe to\b/i);
  expect(text()).toContain('4-H');
  expect(text()).toContain('comes first');
});
