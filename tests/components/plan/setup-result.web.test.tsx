import { projects } from '@/sync/client/projects';

import type { FakeProjectsClient } from '../projects/fake-projects-client';
import { byId, named, seek, text } from '../projects/page';
import { click } from '../ui/mount-web';
import { close, fill, forgetDrafts, open, totals } from './setup-page';

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

describe('the live result', () => {
  it('is a plan from the start: one plate of four fabrics', async () => {
    await open();
    expect(totals()).toMatch(/^6 strips, 1.*5.*8.*yd$/);
    expect(text()).toContain('16 wedges');
    expect(text()).toContain('17½ in, trimmed to 16½ in');
    expect(text()).toContain('1 stack of 4 layers, 4 cuts');
  });

  it('comes to 8 strips and 1½ yd for five plates of 20 wedges, as the maker sets them', async () => {
    await open();
    await click(byId('add-fabric'));
    await fill('block', '12');
    await fill('blocks', '5');
    await fill('wedges', '20');
    await click(named('60 mm'));
    await click(named('Change fabric B, Lantern'));
    await click(byId('dominant'));
    await click(named('Close'));
    expect(totals()).toBe('8 strips, 1½ yd');
    expect(text()).toContain('5 stacks of 5 layers, 4 cuts each');
    expect(text()).toContain('No slack in Lantern. All 9 in of ¼ yd used.');
    expect(text()).toContain('No slack in Fog. All 27 in of ¾ yd used.');
    expect(text()).toContain('½ in spare in A, C, D and E.');
  });

  it('lists strips, needs, cloth to buy and spare of each fabric as a table', async () => {
    await open();
    const rows = [...byId('fabric-table').querySelectorAll('[role=row]')];
    const cells = (row: Element | undefined) =>
      [...(row?.querySelectorAll('[role=cell]') ?? [])].map((cell) => cell.textContent);
    expect(rows[0]?.querySelectorAll('[role=columnheader]')).toHaveLength(5);
    expect(rows).toHaveLength(6);
    expect(cells(rows[2])).toEqual(['1', '5½ in', '¼ yd', '3½ in']);
    expect(cells(rows[5])).toEqual(['1', '17½ in', '½ yd', '½ in']);
  });

  it('buys the next eighth when its offer is taken, and goes back to what is needed', async () => {
    await open();
    const offer = [...document.querySelectorAll<HTMLElement>('[role=button]')].find((button) =>
      button.textContent?.startsWith('Buy'),
    );
    await click(offer ?? document.body);
    expect(text()).not.toContain('spare in Fog');
    await click(named('Change fabric E, Fog'));
    await click(named('Buy what is needed'));
    expect(text()).toContain('½ in spare in Fog.');
  });

  it('lets an offer lapse when the plan comes to need more than that', async () => {
    await open();
    const offer = [...document.querySelectorAll<HTMLElement>('[role=button]')].find((button) =>
      button.textContent?.startsWith('Buy'),
    );
    await click(offer ?? document.body);
    await fill('blocks', '12');
    expect(seek('last-good')).toBeNull();
    await click(byId('make-plan'));
    expect(
      store
        .snapshot()
        .projects[0]?.request?.fabrics.every(({ buyYards }) => buyYards === undefined),
    ).toBe(true);
  });
});
