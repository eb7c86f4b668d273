import { projects } from '@/sync/client/projects';

import type { FakeProjectsClient } from '../projects/fake-projects-client';
import { byId, named, text, typeInto } from '../projects/page';
import { click } from '../ui/mount-web';
import { close, forgetDrafts, open } from './setup-page';

jest.mock('expo-router', () => require('../projects/fake-router').fakeExpoRouter);
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('../projects/fake-projects-client');
  return { projects: new Fake() };
});
const store = projects as unknown as FakeProjectsClient;

beforeEach(async () => {
  store.reset();
  await forgetDrafts();
});
afterEach(close);

describe('fabrics', () => {
  it('are lettered wedges first, the background after them', async () => {
    await open();
    await click(byId('add-fabric'));
    expect(named('Change fabric E, Deep Water')).toBeTruthy();
    expect(named('Change fabric F, Fog')).toBeTruthy();
  });

  it('move up and down without a drag', async () => {
    await open();
    await click(named('Move down, A Sailcloth'));
    expect(named('Change fabric A, Lantern')).toBeTruthy();
    expect(named('Change fabric B, Sailcloth')).toBeTruthy();
    await click(named('Move up, B Sailcloth'));
    expect(named('Change fabric A, Sailcloth')).toBeTruthy();
  });

  it('are removed, and put back where they were', async () => {
    await open();
    await click(named('Change fabric B, Lantern'));
    await click(byId('remove-fabric'));
    expect(named('Change fabric B, Tide')).toBeTruthy();
    await click(named('Put back'));
    expect(named('Change fabric B, Lantern')).toBeTruthy();
  });

  it('take a name of the maker’s own, a colour and a one-way print', async () => {
    await open();
    await click(named('Change fabric A, Sailcloth'));
    await typeInto('fabric-name', 'Grandmother’s apron');
    await click(named('Kelp'));
    await click(byId('one-way'));
    await click(named('Close'));
    await click(byId('make-plan'));
    expect(store.snapshot().projects[0]?.request?.fabrics[0]).toEqual({
      letter: 'A',
      name: 'Grandmother’s apron',
      role: 'wedge',
      colour: '#5F6B35',
      oneWay: true,
      dominant: false,
    });
  });

  it('refuse to go without a name', async () => {
    await open();
    await click(named('Change fabric A, Sailcloth'));
    await typeInto('fabric-name', ' ');
    await click(named('Close'));
    expect(text()).toContain('No name yet. One word is enough.');
  });

  it('give the circle one of theirs, or a cloth of its own', async () => {
    await open();
    await click(named('D Buoy'));
    await click(named('Another cloth'));
    await click(byId('make-plan'));
    const request = store.snapshot().projects[0]?.request;
    expect(request?.centre).toMatchObject({ shape: 'circle', fabric: 'F' });
    expect(request?.fabrics[5]).toMatchObject({ letter: 'F', role: 'circle' });
  });
});
