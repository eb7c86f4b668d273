import type { Page } from 'playwright-core';

import { defaultRequest } from '../../shared/plan/default-request';
import { makePlan } from '../../shared/plan/make-plan';
import { newId } from '../../sync/client/new-id';
import { askStore } from './demo-store';
import { openAt } from './e2e-page';
import { untilCount } from './e2e-station';

const FABRICS = [
  { letter: 'A', name: 'Lantern', role: 'wedge', colour: '#E0AC35' },
  { letter: 'B', name: 'Tide', role: 'wedge', colour: '#86AAB8' },
  { letter: 'C', name: 'Deep Water', role: 'background', colour: '#263C69' },
] as const;

export const request = defaultRequest({
  block: '12',
  blocks: 20,
  wedges: 20,
  tip: 'pointed',
  centre: 'circle',
  fabrics: FABRICS.map((fabric) => ({ ...fabric, oneWay: false, dominant: false })),
});

/** A project with everything made that pairs are sewn from: a tap is a pair. */
export async function makeStation(page: Page): Promise<string> {
  const plan = makePlan(request);
  if (!plan.ok) throw new Error('the plan was refused');
  const id = newId(Date.now());
  const pair = plan.value.steps.find(({ role }) => role === 'pair');
  const before = plan.value.steps.filter(({ position }) => position < (pair?.position ?? 0));
  await openAt(page, '/projects');
  await page.getByTestId('open-example').waitFor();
  await askStore(page, [
    { do: 'create', id, name: 'Lighthouse', note: '', request },
    ...before.flatMap(({ key: step, lanes }) =>
      lanes.map(({ key: lane, target }) => ({
        do: 'set' as const,
        id,
        key: { step, lane, kind: 'done' as const },
        want: target,
      })),
    ),
  ]);
  return `/projects/${id}/machine?step=pair`;
}

/** Opens the station, and looks at the count that it shows first. */
export async function openStation(page: Page, station: string, count: number): Promise<void> {
  await openAt(page, station);
  await page.getByTestId('tally-number').waitFor();
  await untilCount(page, count);
}
