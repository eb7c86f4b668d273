import { readProject } from '@/components/projects/read-project';
import { chooseCarryOn } from '@/components/ready/carry-on';
import { listStationRows } from '@/components/ready/station-rows';

import { FakeProjectsClient, fabricsFor, ringRequest } from '../projects/fake-projects-client';

const store = new FakeProjectsClient();
const readings = () => store.snapshot().projects.map(readProject);

/** Counts the first steps of a project full. */
async function finish(id: string, steps: number): Promise<void> {
  const project = store.snapshot().projects.find((candidate) => candidate.id === id);
  for (const step of project?.steps.slice(0, steps) ?? []) {
    for (const { key, target } of step.lanes) {
      await store.set(id, { step: step.key, lane: key, kind: 'done' }, target);
    }
  }
}

const small = () => ringRequest({ blocks: 1, wedges: 8, fabrics: fabricsFor(2) });
const rowsNow = () => {
  const carryOn = chooseCarryOn(readings());
  return carryOn ? listStationRows(readings(), carryOn.reading) : [];
};

beforeEach(() => store.reset());

describe('the project to carry on with', () => {
  it('is none when there is none', () => {
    expect(chooseCarryOn([])).toBeNull();
  });

  it('is the one worked at last', async () => {
    const first = store.add('First', small());
    store.add('Second', small());
    await finish(first.id, 1);
    expect(chooseCarryOn(readings())?.reading.project.name).toBe('First');
  });

  it('is another when that one is finished, and the finished one when all are', async () => {
    const first = store.add('First', small());
    const second = store.add('Second', small());
    await finish(first.id, 99);
    expect(chooseCarryOn(readings())?.reading.project.name).toBe('Second');
    await finish(second.id, 99);
    expect(chooseCarryOn(readings())).toMatchObject({ step: null });
  });
});

describe('the rows by station', () => {
  it('show the carry-on project where something is ready, and what it waits for elsewhere', () => {
    store.add('Only', small());
    const rows = rowsNow().map(({ station, state, step }) => [station, state, step.role]);
    expect(rows).toEqual([
      ['table', 'ready', 'strip'],
      ['machine', 'waiting', 'tip-sew'],
      ['iron', 'waiting', 'tip-turn'],
    ]);
  });

  it('have a chair where the appliqué is sewn by hand', () => {
    store.add('Only', ringRequest({ blocks: 1, applique: 'hand' }));
    expect(rowsNow().map(({ station }) => station)).toContain('chair');
  });

  it('show the latest other project where the carry-on project has nothing ready', async () => {
    const third = store.add('Third', small());
    const second = store.add('Second', small());
    store.add('First', small());
    await finish(third.id, 4);
    await finish(second.id, 4);
    const first = store.add('Newest', small());
    const machine = rowsNow().find(({ station }) => station === 'machine');
    expect(chooseCarryOn(readings())?.reading.project.id).toBe(first.id);
    expect(machine).toMatchObject({ state: 'ready', other: true, moreProjects: 1 });
    expect(machine?.reading.project.name).toBe('Second');
  });

  it('count the other projects that are ready at a station too', () => {
    store.add('One', small());
    store.add('Two', small());
    store.add('Three', small());
    expect(rowsNow()[0]).toMatchObject({ station: 'table', other: false, moreProjects: 2 });
  });

  it('say done where nothing is left', async () => {
    const only = store.add('Only', small());
    await finish(only.id, 99);
    expect(rowsNow().every(({ state }) => state === 'done')).toBe(true);
  });
});
