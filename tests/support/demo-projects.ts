import type { Page } from 'playwright-core';

import { newId } from '../../sync/client/new-id';
import { defaultRequest } from '../../shared/plan/default-request';
import { askStore } from './demo-store';
import { openAt, press } from './e2e-page';

/** Where the projects of the demo are found. */
export interface Demo {
  /** Harbour Lights of the example: pointed tips, a circle, half of it cut */
  circle: string;
  /** one with an open hole, sewn on by hand */
  hole: string;
}

const FABRICS = [
  { letter: 'A', name: 'Lantern', role: 'wedge', colour: '#E0AC35' },
  { letter: 'B', name: 'Tide', role: 'wedge', colour: '#86AAB8' },
  { letter: 'C', name: 'Deep Water', role: 'background', colour: '#263C69' },
] as const;

/** Opens the example. @returns the address of its first project */
export async function openExample(page: Page): Promise<string> {
  await openAt(page, '/projects');
  await press(page, 'open-example');
  const line = page.getByTestId('project-line').filter({ hasText: 'Harbour Lights' });
  const circle = await line.getAttribute('href');
  if (!circle) throw new Error('the example is not there');
  return circle;
}

/** Opens the example, and keeps a ring with an open hole beside it. */
export async function makeDemo(page: Page): Promise<Demo> {
  const circle = await openExample(page);
  const id = newId(Date.now());
  const request = defaultRequest({
    block: '12',
    blocks: 1,
    wedges: 12,
    tip: 'flat',
    centre: 'none',
    applique: 'hand',
    fabrics: FABRICS.map((fabric) => ({ ...fabric, oneWay: false, dominant: false })),
  });
  await askStore(page, [{ do: 'create', id, name: 'Porthole', note: '', request }]);
  return { circle, hole: `/projects/${id}` };
}
