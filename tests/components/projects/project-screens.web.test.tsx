import { PlanScreen } from '@/components/plan/plan-screen';
import { ProjectScreen } from '@/components/projects/project-screen';
import { ProjectsScreen } from '@/components/projects/projects-screen';
import { projects } from '@/sync/client/projects';

import { click, find, type Mounted } from '../ui/mount-web';
import { type FakeProjectsClient, ringRequest } from './fake-projects-client';
import { fakeRouter } from './fake-router';
import { byId, named, openPage, seek, text, typeInto } from './page';

jest.mock('expo-router', () => require('./fake-router').fakeExpoRouter);
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('./fake-projects-client');
  return { projects: new Fake() };
});
const store = projects as unknown as FakeProjectsClient;

let page: Mounted;
const names = () => store.snapshot().projects.map(({ name }) => name);

beforeEach(() => {
  store.reset();
  fakeRouter.reset();
});
afterEach(() => page.unmount());

describe('Projects', () => {
  const open = async () => {
    page = await openPage(<ProjectsScreen />);
  };

  it('is empty calmly', async () => {
    await open();
    expect(text()).toContain('No projects yet');
    await click(byId('open-example'));
    expect(text()).toContain('Pier Runner');
    expect(text()).toContain('These are an example');
  });

  it('lists the newest work first, with what is done', async () => {
    await store.openExample();
    await open();
    const lines = [...document.querySelectorAll('[data-testid=project-line]')];
    expect(lines[0]?.textContent).toContain('Harbour Lights');
    expect(lines[0]?.textContent).toContain('24 of 48 pieces cut');
    expect(lines[0]?.getAttribute('href')).toBe(`/projects/${store.snapshot().projects[0]?.id}`);
    await click(byId('plan-a-quilt'));
    expect(fakeRouter.went).toEqual(['/projects/new']);
  });

  it('waits while the store opens', async () => {
    store.startUp();
    await open();
    expect(text()).not.toContain('No projects yet');
    expect(text()).toContain('Projects');
  });

  it('says when the store did not open', async () => {
    store.fail({ kind: 'storage-full' });
    await open();
    expect(find('[role=alert]').textContent).toContain('This device is full');
  });

  it('needs no network', async () => {
    jest.spyOn(navigator, 'onLine', 'get').mockReturnValue(false);
    store.add('Harbour', ringRequest());
    await open();
    expect(byId('saved-chip').textContent).toBe('Saved on this device');
    expect(text()).toContain('Harbour');
  });
});

describe('a project', () => {
  const open = async (id: string) => {
    fakeRouter.reset({ id });
    page = await openPage(<ProjectScreen />);
  };

  it('shows what is ready at each station and every step in order', async () => {
    const { id, steps } = store.add('Harbour', ringRequest());
    await open(id);
    expect(find('[role=heading][aria-level="1"]').textContent).toBe('Harbour');
    expect(byId('row-table').textContent).toContain('5 strips');
    expect(byId('row-machine').textContent).toContain('Not yet');
    const shown = steps.map(({ role }) => byId(`step-${role}`).textContent);
    expect(shown[0]).toContain('1. Cut strips 4 in tall');
    expect(shown[3]).toContain('0 of 100 pieces cut');
    expect(byId('step-cut').getAttribute('href')).toBe(`/projects/${id}/table?step=cut`);
  });

  it('leads on: to the next step, to the plan, to a copy', async () => {
    const { id } = store.add('Harbour', ringRequest());
    await open(id);
    await click(byId('carry-on-go'));
    await click(byId('see-plan'));
    await click(byId('copy-project'));
    expect(fakeRouter.went).toEqual([
      `/projects/${id}/table?step=strip`,
      `/projects/${id}/plan`,
      `/projects/new?from=${id}`,
    ]);
  });

  it('is renamed in place, but not to nothing', async () => {
    const { id } = store.add('Harbour', ringRequest());
    await open(id);
    await click(byId('rename'));
    await typeInto('project-name', '  ');
    await click(byId('save-name'));
    expect(names()).toEqual(['Harbour']);
    expect(text()).toContain('No name yet. One word is enough.');
    await typeInto('project-name', 'Quay ');
    await click(byId('save-name'));
    expect(names()).toEqual(['Quay']);
    expect(find('[role=heading][aria-level="1"]').textContent).toBe('Quay');
  });

  it('is deleted after asking, and put back from the toast', async () => {
    const { id } = store.add('Harbour', ringRequest());
    await open(id);
    await click(byId('delete-project'));
    await click(named('Keep it'));
    expect(names()).toEqual(['Harbour']);
    await click(byId('delete-project'));
    await click(byId('confirm-delete'));
    expect(names()).toEqual([]);
    expect(fakeRouter.went).toEqual(['/projects']);
    await click(named('Put back'));
    expect(names()).toEqual(['Harbour']);
  });

  it('says when it is not on this device', async () => {
    await open('elsewhere');
    expect(text()).toContain('This project is not here');
    await click(named('All projects'));
    expect(fakeRouter.went).toEqual(['/projects']);
  });

  it('waits while the store opens', async () => {
    store.startUp();
    await open('p1');
    expect(text()).not.toContain('This project is not here');
  });

  it('says when the store did not open', async () => {
    store.fail({ kind: 'failed', detail: 'disk' });
    await open('p1');
    expect(text()).toContain('Your projects did not open');
  });
});

describe('a project’s plan', () => {
  const open = async (id: string) => {
    fakeRouter.reset({ id });
    page = await openPage(<PlanScreen />);
  };

  it('shows cloth, strips, stacks, sizes and steps', async () => {
    const { id, steps } = store.add('Harbour', ringRequest());
    await open(id);
    expect(text()).toContain('8 strips, 1½ yd');
    expect(text()).toContain('5 lengths of 8 in, 20 wedges');
    expect(text()).toContain('17 × 5 in left');
    expect(text()).toContain('2 strips 13½ in');
    expect(text()).toContain('20 cuts × 5 = 100 pieces');
    expect(text()).toContain(
      'Uses 5 stacks in A+B+C+D+E. Makes 20 wedges each in A, B, C, D and E.',
    );
    expect(text()).toContain(`${steps.length}. Trim the block`);
    expect(text()).toContain('No slack in Cloth B.');
  });

  it('is changed in a copy, whether it has counts or not', async () => {
    const { id } = store.add('Harbour', ringRequest());
    await open(id);
    expect(text()).toContain('Change it in a copy.');
    await click(byId('copy-project'));
    expect(fakeRouter.went).toEqual([`/projects/new?from=${id}`]);
  });

  it('says when its project is not here', async () => {
    await open('elsewhere');
    expect(text()).toContain('This project is not here');
    expect(seek('copy-project')).toBeNull();
  });
});
