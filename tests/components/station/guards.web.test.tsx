import AsyncStorage from '@react-native-async-storage/async-storage';

import { ringRequest } from '../projects/fake-projects-client';
import { byId, seek, text, typeInto } from '../projects/page';
import { click, type Mounted } from '../ui/mount-web';
import {
  checkDone,
  createProject,
  fill,
  holdTime,
  kept,
  openStation,
  pressKey,
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

describe('the guards', () => {
  it('ask before the 21st cut, and count it on yes', async () => {
    await fill(id, 'cut', 20);
    await open('table', 'cut');
    expect(zoneName()).toContain('100 of 100');
    await tap();
    expect(text()).toContain('105 of 100 pieces. Count it?');
    expect(kept(id, 'cut', 'done')).toBe(20);
    await click(byId('count-yes'));
    await settle();
    expect(zoneName()).toContain('105 of 100');
    await click(byId('undo'));
    await settle();
    expect(zoneName()).toContain('100 of 100');
  });

  it('start on the question, where a pedal neither counts nor answers', async () => {
    await fill(id, 'cut', 20);
    await open('table', 'cut');
    await tap();
    expect(document.activeElement?.textContent).toBe('105 of 100 pieces. Count it?');
    await pressKey(' ', document.activeElement ?? document.body);
    await pressKey('Enter', document.activeElement ?? document.body);
    expect(text()).toContain('105 of 100 pieces. Count it?');
    expect(kept(id, 'cut', 'done')).toBe(20);
    await click(byId('count-no'));
    expect(kept(id, 'cut', 'done')).toBe(20);
  });

  it('ask when an entry is more than three stacks at once', async () => {
    await open('table', 'cut');
    await click(byId('keypad'));
    await typeInto('keypad-field', '65');
    await click(byId('keypad-yes'));
    expect(text()).toContain('65 pieces more, 4 stacks at once. Count it?');
    await click(byId('count-yes'));
    await settle();
    expect(zoneName()).toContain('65 of 100');
  });

  it('ask once before a step that has nothing on hand yet', async () => {
    await open('machine', 'pair');
    await tap();
    expect(text()).toMatch(/Waiting for .* Count it all the same\?/);
    await click(byId('count-yes'));
    await settle();
    await tap();
    expect(kept(id, 'pair', 'done')).toBe(2);
    expect(text()).toContain('2 more than were turned. Count the piles again?');
  });
});

describe('a miscut', () => {
  async function miscut(letter: string): Promise<void> {
    await click(byId('loss'));
    await click(byId(`item-wedge:${letter}`));
    await click(byId('loss-yes'));
    await settle();
  }

  it('asks which piece, takes it off, and says that cloth must be bought', async () => {
    await fill(id, 'cut', 20);
    await open('table', 'cut');
    await miscut('D');
    expect(text()).toContain('99 good, 1 to recut');
    expect(text()).toContain(
      'No offcut is wide enough: 2 in left of a strip, 2¼ in needed. Buy 1⁄8 yd of D.',
    );
    expect(kept(id, 'cut', 'lost', 'wedge:D')).toBe(1);
    await click(byId('recut-ok'));
    expect(zoneName()).toContain('99 of 100 pieces cut. Tap adds 1.');
    expect(text()).toContain('1 layer: one cut = 1 piece');
    await tap();
    expect(zoneName()).toContain('100 of 100');
    expect(seek('count-question')).toBeNull();
  });

  it('finds the end of the circle’s strip for a piece in B', async () => {
    await fill(id, 'cut', 20);
    await open('table', 'cut');
    await miscut('B');
    expect(text()).toContain('Cut it from the 17 × 5 in left of the circle strip.');
  });

  it('leaves the stack in hand until it is full', async () => {
    await fill(id, 'cut', 8);
    await open('table', 'cut');
    await tap();
    await miscut('D');
    await click(byId('recut-ok'));
    expect(zoneName()).toContain('44 of 100 pieces cut. Tap adds 5.');
    expect(seek('lane-D1')).not.toBeNull();
  });

  it('opens a lane of its own for each later loss of the same fabric', async () => {
    await fill(id, 'cut', 20);
    await open('table', 'cut');
    await miscut('D');
    await click(byId('recut-ok'));
    await miscut('D');
    expect(project(id).extraLanes.map(({ key }) => key)).toEqual(['D1', 'D1 2']);
  });

  it('asks for the piece first, and takes no more than there are', async () => {
    await fill(id, 'cut', 1);
    await open('table', 'cut');
    await click(byId('loss'));
    await click(byId('loss-yes'));
    expect(text()).toContain('Choose one first.');
    await click(byId('item-wedge:A'));
    await typeInto('loss-count', '2');
    expect(text()).toContain('Use 1 to 1.');
    await click(byId('loss-yes'));
    expect(kept(id, 'cut', 'lost')).toBe(0);
  });
});
