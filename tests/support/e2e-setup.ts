import type { Page } from 'playwright-core';

import { press, retype, titleOf, until } from './e2e-page';

/** Stars a wedge fabric: rows carry their place in the list. */
async function makeDominant(page: Page, row: string): Promise<void> {
  await press(page, row);
  await press(page, 'dominant');
  await page.getByTestId('fabric-sheet').getByRole('button', { name: 'Close' }).click();
  await page.getByTestId('fabric-sheet').waitFor({ state: 'detached' });
}

/** Fills in five 12-inch plates of 20 wedges from five fabrics, the second one dominant. */
export async function fillInFivePlates(page: Page): Promise<void> {
  await retype(page, 'block', '12');
  await retype(page, 'blocks', '5');
  await retype(page, 'wedges', '20');
  await press(page, 'add-fabric');
  await makeDominant(page, 'fabric:1');
  await page.getByTestId('bladeMm').getByText('60 mm').click();
}

/** Makes the plan on the screen and waits for its project. @returns its address */
export async function makeProject(page: Page, name: string): Promise<string> {
  await retype(page, 'name', name);
  await press(page, 'make-plan');
  await until(() => titleOf(page), name);
  return new URL(page.url()).pathname;
}
