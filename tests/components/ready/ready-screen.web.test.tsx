import { ReadyScreen } from '@/components/ready/ready-screen';
import { projects } from '@/sync/client/projects';

import { type FakeProjectsClient, ringRequest } from '../projects/fake-projects-client';
import { fakeRouter } from '../projects/fake-router';
import { byId, named, openPage, seek, text } from '../projects/page';
import { click, find, type Mounted } from '../ui/mount-web';

jest.mock('expo-router', () => require('../projects/fake-router').fakeExpoRouter);
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('../projects/fake-projects-client');
  return { projects: new Fake() };
});
const store = projects as unknown as FakeProjectsClient;

let page: Mounted;
const open = async () => {
  page = await openPage(<ReadyScreen />);
};

beforeEach(() => {
  store.reset();
  fakeRouter.reset();
});
afterEach(() => page.unmount());

it('is empty calmly: plan a quilt, or open the example', async () => {
  await open();
  expect(text()).toContain('Nothing on the mat yet');
  await click(byId('plan-a-quilt'));
  expect(fakeRouter.went).toEqual(['/projects/new']);
  await click(byId('open-example'));
  expect(byId('carry-on').textContent).toContain('Harbour Lights');
});

it('carries on where the maker stopped', async () => {
  await store.openExample();
  await open();
  const card = byId('carry-on').textContent;
  expect(card).toContain('Cut 4 wedges from each stack');
  expect(card).toContain('24 of 48 pieces cut');
  await click(byId('carry-on-go'));
  const { id } = store.snapshot().projects[0] ?? { id: '' };
  expect(fakeRouter.went).toEqual([`/projects/${id}/table?step=cut`]);
});

it('puts the number first, station by station, and links to the step', async () => {
  await store.openExample();
  await open();
  const { id } = store.snapshot().projects[0] ?? { id: '' };
  const row = byId('row-table');
  expect(row.textContent).toContain('6 cuts');
  expect(row.textContent).toContain('and 2 more projects');
  expect(row.getAttribute('href')).toBe(`/projects/${id}/table?step=cut`);
  expect(byId('row-machine').textContent).toContain('Enough for');
});

it('lists the other projects', async () => {
  await store.openExample();
  await open();
  const names = [...document.querySelectorAll('[data-testid=project-line]')].map(
    (line) => line.textContent,
  );
  expect(names).toHaveLength(2);
  expect(names[0]).toContain('Shed Window');
  expect(names[1]).toContain('Pier Runner');
});

it('says quietly what is an example and takes it away in one tap', async () => {
  await store.openExample();
  store.add('My own', ringRequest());
  await open();
  await click(byId('take-example-away'));
  expect(store.snapshot().projects.map(({ name }) => name)).toEqual(['My own']);
  expect(seek('example-row')).toBeNull();
  await click(named('Put back'));
  expect(store.snapshot().projects).toHaveLength(4);
});

it('waits calmly while the store opens', async () => {
  store.startUp();
  await open();
  expect(text()).not.toContain('Nothing on the mat yet');
  expect(byId('saved-chip').textContent).toBe('Opening');
});

it('says what did not work, what is kept and what to do', async () => {
  store.fail({ kind: 'open-elsewhere' });
  await open();
  expect(find('[role=alert]').textContent).toContain('Open in another tab');
  expect(byId('try-again')).toBeTruthy();
});

it('is the same without a network: counts are on this device', async () => {
  jest.spyOn(navigator, 'onLine', 'get').mockReturnValue(false);
  await store.openExample();
  await open();
  expect(byId('saved-chip').textContent).toBe('Saved on this device');
  expect(byId('carry-on-go')).toBeTruthy();
});
