import AsyncStorage from '@react-native-async-storage/async-storage';
import { act } from 'react';

import { ringRequest } from '../projects/fake-projects-client';
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
