import {
  countLine,
  pickCurrentStep,
  readyNumber,
  stepLine,
  stepsLine,
} from '@/components/projects/progress-texts';
import { readProject } from '@/components/projects/read-project';
import type { StepRole } from '@/shared/model/codes';
import type { StepProgress } from '@/shared/model/tally';
import type { ProjectView } from '@/sync/client/projects-client';

import { FakeProjectsClient, ringRequest } from './fake-projects-client';

const store = new FakeProjectsClient();
let project: ProjectView;

/** Counts every step before this one full, and some taps of each of its lanes. */
async function countUpTo(role: StepRole, taps: (lane: string, target: number) => number) {
  for (const step of project.steps) {
    for (const lane of step.lanes) {
      const want = step.role === role ? taps(lane.key, lane.target) : lane.target;
      await store.set(project.id, { step: step.key, lane: lane.key, kind: 'done' }, want);
    }
    if (step.role === role) return;
  }
}

function read(role: StepRole): StepProgress {
  const current = store.snapshot().projects.find(({ id }) => id === project.id);
  const step =
    current && readProject(current).progress.steps.find((candidate) => candidate.role === role);
  if (!step) throw new Error(`no step ${role}`);
  return step;
}

beforeEach(() => {
  store.reset();
  project = store.add('Harbour', ringRequest());
});

it('counts cuts at a cut, and pieces in its line', async () => {
  await countUpTo('cut', () => 8);
  expect(readyNumber(read('cut'))).toEqual({ count: 12, word: 'cuts' });
  expect(stepLine(read('cut'))).toBe('40 of 100 pieces cut');
});

it('starts from cloth without waiting for anything', () => {
  expect(readyNumber(read('strip'))).toEqual({ count: 5, word: 'strips' });
  expect(stepLine(read('strip'))).toBe('0 of 5 strips cut');
});

it('says what a step waits for', () => {
  expect(stepLine(read('ring'))).toBe('Waiting for 10 halves');
  expect(stepLine(read('pair'))).toBe('Waiting for 80 turned tips');
  expect(stepLine(read('applique'))).toBe(
    'Waiting for 5 pressed rings, 5 turned circles and 5 folded backgrounds',
  );
});

it('says what is enough on hand, by lane while the lanes are few', async () => {
  await countUpTo('tip-turn', (_, target) => target);
  const { lanes } = read('pair');
  expect(lanes).toHaveLength(2);
  expect(stepLine(read('pair'))).toMatch(/^Enough for 20 pairs .\+. and 20 .\+.$/);
});

it('says how many fewer pairs a lost tip leaves', async () => {
  await countUpTo('tip-turn', (_, target) => target);
  const turn = read('tip-turn');
  const [, second] = read('pair').lanes;
  const item = Object.keys(second?.lane.consumes ?? {})[0] ?? '';
  await store.set(project.id, { step: turn.key, lane: item, kind: 'lost' }, 1);
  expect(stepLine(read('pair'))).toMatch(/^Enough for 20 pairs .\+. and 19 .\+.$/);
});

it('says that a step is done', async () => {
  await countUpTo('strip', (_, target) => target);
  expect(stepLine(read('strip'))).toBe('All 5 strips cut');
  expect(countLine(read('strip'))).toBe('5 of 5 strips cut');
});

it('carries on at the last step while it is ready, then at the first that is', async () => {
  await countUpTo('cut', () => 8);
  const { steps } = readProject(store.snapshot().projects[0] ?? project).progress;
  expect(pickCurrentStep(steps, read('cut').key)?.role).toBe('cut');
  expect(pickCurrentStep(steps, read('tip-sew').key)?.role).toBe('tip-sew');
  expect(pickCurrentStep(steps, read('strip').key)?.role).toBe('cut');
  expect(stepsLine(steps)).toMatch(/^3 of \d+ steps done$/);
});
