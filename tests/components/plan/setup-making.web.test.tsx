import { projects } from '@/sync/client/projects';

import { type FakeProjectsClient, ringRequest } from '../projects/fake-projects-client';
import { fakeRouter } from '../projects/fake-router';
import { byId, leaveField, named, seek, text, typeInto } from '../projects/page';
import { click } from '../ui/mount-web';
import { close, fill, forgetDrafts, open, totals, valueOf } from './setup-page';

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

describe('making the plan', () => {
  it('creates the project and goes to its page', async () => {
    await open();
    await typeInto('name', ' Kitchen plates ');
    await click(byId('make-plan'));
    expect(store.snapshot().projects.map(({ name }) => name)).toEqual(['Kitchen plates']);
    expect(fakeRouter.went).toEqual(['/projects/p1']);
  });

  it('names a nameless project after its plates', async () => {
    await open();
    await fill('blocks', '3');
    await click(byId('make-plan'));
    expect(store.snapshot().projects[0]?.name).toBe('3 plates, 16 in');
  });

  it('goes to the first wrong field instead, opening what hides it', async () => {
    await open();
    await click(byId('more'));
    await typeInto('seam', 'wide');
    await leaveField('seam');
    await click(byId('make-plan'));
    expect(document.activeElement).toBe(byId('seam'));
    await typeInto('wedges', '4');
    await click(byId('make-plan'));
    expect(document.activeElement).toBe(byId('wedges'));
    expect(store.snapshot().projects).toEqual([]);
  });

  it('says when the device is full, and keeps what was typed', async () => {
    await open();
    await fill('block', '12');
    store.refuseWith = { kind: 'storage-full' };
    await click(byId('make-plan'));
    expect(text()).toContain('This device is full.');
    expect(valueOf('block')).toBe('12');
    expect(fakeRouter.went).toEqual([]);
  });
});

describe('a draft', () => {
  it('is there again after a reload, wrong texts too', async () => {
    await open();
    await fill('block', '12');
    await fill('wedges', 'many');
    await click(byId('add-fabric'));
    await close();
    await open();
    expect([valueOf('block'), valueOf('wedges')]).toEqual(['12', 'many']);
    expect(named('Change fabric E, Deep Water')).toBeTruthy();
    expect(text()).toContain('Not a whole number.');
  });

  it('is gone once its plan is made', async () => {
    await open();
    await fill('block', '12');
    await click(byId('make-plan'));
    await close();
    await open();
    expect(valueOf('block')).toBe('16');
  });

  it('starts afresh only after asking', async () => {
    await open();
    await fill('block', '12');
    await click(byId('start-afresh'));
    await click(named('Keep typing'));
    expect(valueOf('block')).toBe('12');
    await click(byId('start-afresh'));
    await click(byId('confirm-afresh'));
    expect(valueOf('block')).toBe('16');
  });
});

describe('a copy', () => {
  it('plans the same quilt, and its sizes follow where they followed', async () => {
    const source = store.add('Harbour', ringRequest());
    await open({ from: source.id });
    expect(totals()).toBe('8 strips, 1½ yd');
    await click(byId('make-plan'));
    const [copy] = store.snapshot().projects;
    expect(copy?.name).toBe('Harbour, copy');
    expect(copy?.request).toEqual(source.request);
    await close();
    await open({ from: source.id });
    await fill('block', '16');
    await click(byId('more'));
    expect(valueOf('stripHeight')).toBe('5½');
  });

  it('says when the project to copy is not here', async () => {
    await open({ from: 'elsewhere' });
    expect(text()).toContain('This project is not here');
  });
});

describe('while the store is not open', () => {
  it('waits calmly', async () => {
    store.startUp();
    await open();
    expect(seek('make-plan')).toBeNull();
    expect(text()).toContain('Plan the plates');
  });

  it('says what did not work and tries again', async () => {
    store.fail({ kind: 'failed', detail: 'disk' });
    await open();
    expect(text()).toContain('Your projects did not open');
    expect(byId('try-again')).toBeTruthy();
  });

  it('plans without a network', async () => {
    jest.spyOn(navigator, 'onLine', 'get').mockReturnValue(false);
    await open();
    await click(byId('make-plan'));
    expect(fakeRouter.went).toEqual(['/projects/p1']);
    expect(byId('saved-chip').textContent).toBe('Saved on this device');
  });
});
