import AsyncStorage from '@react-native-async-storage/async-storage';
import { act } from 'react';

import { projects } from '@/sync/client/projects';

import { ringRequest } from '../projects/fake-projects-client';
import { fakeRouter } from '../projects/fake-router';
import { byId, named, seek, text, typeInto } from '../projects/page';
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
  wait,
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

describe('counting', () => {
  it('adds a stack’s layers with a tap, and keeps it before it shows', async () => {
    await open('table', 'cut');
    expect(zoneName()).toContain('0 of 100 pieces cut. Tap adds 5.');
    await tap();
    expect(kept(id, 'cut', 'done')).toBe(1);
    expect(zoneName()).toContain('5 of 100 pieces cut. Tap adds 5.');
    expect(text()).toContain('5 layers: one cut = 5 pieces');
    expect(text()).toContain('Stack 1 of 5');
  });

  it('moves on to the next stack after its last cut', async () => {
    await fill(id, 'cut', 3);
    await open('table', 'cut');
    await tap();
    expect(text()).toContain('Stack 2 of 5');
  });

  it('counts by Space, Enter, Page Down and the right arrow, and takes back by Backspace', async () => {
    await open('table', 'cut');
    for (const key of [' ', 'Enter', 'PageDown', 'ArrowRight']) await pressKey(key);
    expect(zoneName()).toContain('20 of 100');
    await pressKey('Backspace');
    expect(zoneName()).toContain('15 of 100');
    expect(byId('toast').textContent).toBe('Took back 5. Now 15.Put back');
    await click(named('Put back'));
    await settle();
    expect(zoneName()).toContain('20 of 100');
  });

  it('drops none of many quick taps, and keeps their order', async () => {
    await open('table', 'cut');
    for (let taps = 0; taps < 12; taps += 1) {
      wait(180);
      act(() => byId('tally').click());
    }
    await settle();
    await settle();
    expect(kept(id, 'cut', 'done')).toBe(12);
    expect(zoneName()).toContain('60 of 100');
  });

  it('does not press a button that was tapped before when the pedal follows', async () => {
    await open('table', 'cut');
    const keypad = byId('keypad');
    keypad.focus();
    await pressKey(' ', keypad);
    expect(zoneName()).toContain('5 of 100');
    expect(seek('keypad-dialog')).toBeNull();
  });

  it('leaves a control its keys once Tab has reached it', async () => {
    await open('table', 'cut');
    await pressKey('Tab');
    byId('keypad').focus();
    await pressKey(' ', byId('keypad'));
    expect(zoneName()).toContain('0 of 100');
    await pressKey('PageDown', byId('keypad'));
    expect(zoneName()).toContain('5 of 100');
  });

  it('takes a count back that this device did not make with a plain −1', async () => {
    await open('table', 'cut');
    await click(byId('undo'));
    await settle();
    expect(zoneName()).toContain('0 of 100');
    expect(seek('toast')).toBeNull();
  });
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

describe('the keypad', () => {
  it('sets pieces exactly, up to three stacks without a question', async () => {
    await open('table', 'cut');
    await click(byId('keypad'));
    await typeInto('keypad-field', '60');
    await click(byId('keypad-yes'));
    await settle();
    expect(zoneName()).toContain('60 of 100');
    expect(byId('undo').getAttribute('aria-label')).toBe('Take back 60');
  });

  it('offers the two nearest counts when the pieces are no whole number of cuts', async () => {
    await open('table', 'cut');
    await click(byId('keypad'));
    await typeInto('keypad-field', '42');
    expect(seek('keypad-yes')).toBeNull();
    await click(byId('keypad-40'));
    await settle();
    expect(zoneName()).toContain('40 of 100');
  });

  it('says what works when something else than a count is typed', async () => {
    await open('table', 'cut');
    await click(byId('keypad'));
    await typeInto('keypad-field', 'lots');
    await click(byId('keypad-yes'));
    expect(text()).toContain('Not a count. Use 0 or a whole number.');
    expect(kept(id, 'cut', 'done')).toBe(0);
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
    expect(byId('loss').getAttribute('aria-label')).toBe('Unpick, 2 so far');
  });
});

describe('the lock', () => {
  it('stops taps, keys and undo', async () => {
    await open('table', 'cut');
    await tap();
    await click(byId('lock'));
    await tap();
    await pressKey(' ');
    await pressKey('Backspace');
    await click(byId('undo'));
    await settle();
    expect(kept(id, 'cut', 'done')).toBe(1);
    expect(zoneName()).toContain('Hold to unlock');
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
