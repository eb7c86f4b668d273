import AsyncStorage from '@react-native-async-storage/async-storage';

import { projects } from '@/sync/client/projects';

import { ringRequest } from '../projects/fake-projects-client';
import { fakeRouter } from '../projects/fake-router';
import { byId, text, typeInto } from '../projects/page';
import { click, type Mounted } from '../ui/mount-web';
import {
  checkDone,
  createProject,
  fill,
  holdTime,
  kept,
  openStation,
  project,
  settle,
  tap,
  zoneName,
} from './station-support';

jest.setTimeout(60_000);
jest.mock('expo-router', () => require('./station-router').stationRouter);
jest.mock('@/sync/client/projects', () => require('./counting-store'));
jest.mock('expo-keep-awake', () => ({
  activateKeepAwakeAsync: async () => undefined,
  deactivateKeepAwake: async () => undefined,
}));

let page: Mounted;
let id = '';
const open = async (station: string, step?: string) => {
  page = await openStation(id, station, step);
};

beforeEach(async () => {
  holdTime();
  await AsyncStorage.clear();
  await checkDone();
  id = await createProject(ringRequest());
  for (const role of ['strip', 'length', 'stack']) await fill(id, role);
});
afterEach(async () => {
  await page.unmount();
  jest.restoreAllMocks();
});

describe('lanes', () => {
  const upTo = async (role: string) => {
    for (const each of ['cut', 'tip-sew', 'tip-trim', 'tip-turn']) {
      await fill(id, each);
      if (each === role) return;
    }
  };

  it('say how many of each there is enough for', async () => {
    await upTo('tip-turn');
    await open('machine', 'pair');
    expect(text()).toContain('Enough for 20 pairs A+C and 20 D+E');
  });

  it('open by themselves when the one before is full, and change with a chip', async () => {
    await upTo('tip-turn');
    const [first, second] = project(id).steps.find(({ role }) => role === 'pair')?.lanes ?? [];
    const pair = project(id).steps.find(({ role }) => role === 'pair')?.key ?? '';
    await projects.set(id, { step: pair, lane: first?.key ?? '', kind: 'done' }, 19);
    await open('machine', 'pair');
    await tap();
    expect(kept(id, 'pair', 'done', first?.key)).toBe(20);
    await tap();
    expect(kept(id, 'pair', 'done', second?.key)).toBe(1);
    await click(byId(`lane-${first?.key}`));
    await tap();
    expect(text()).toContain('21 of 20, Pair A+C. Count it?');
  });

  it('give pieces back when a pair is unpicked', async () => {
    await upTo('tip-turn');
    await fill(id, 'pair', 5);
    await open('machine', 'pair');
    await click(byId('loss'));
    await typeInto('unpick-count', '2');
    await click(byId('unpick-yes'));
    await settle();
    expect(kept(id, 'pair', 'unpicked')).toBe(2);
    expect(zoneName()).toContain('8 of 40');
    expect(byId('loss').textContent).toBe('Unpick2 so far');
  });
});

describe('what shows', () => {
  it('is the step asked for, with its number in the plan', async () => {
    await open('machine', 'half');
    expect(text()).toContain('Sew the halves');
    expect(text()).toMatch(/Step \d+ of 18/);
  });

  it('is the first step with something ready, and the address then names it', async () => {
    await open('table');
    expect(text()).toContain('Cut 4 wedges from each stack');
    expect(fakeRouter.went.join()).toContain('"step":"cut"');
  });

  it('is the next step’s name when a step is done', async () => {
    await fill(id, 'cut');
    await open('table', 'cut');
    expect(byId('next-step').textContent).toContain('Sew the tips in a chain');
  });

  it('says that a project is not on this device', async () => {
    id = 'nowhere';
    await open('table');
    expect(text()).toContain('Not on this device');
  });

  it('says that the plan has no step at a station', async () => {
    await open('wall');
    expect(text()).toContain('This plan has no steps at the Wall.');
  });
});
