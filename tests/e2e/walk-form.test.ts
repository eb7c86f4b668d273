import type { Page } from 'playwright-core';

import { openAt, press, retype, titleOf, until, untilSays, wordsOf } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';

const session = openSession();

beforeAll(async () => {
  await openAt(session.page, '/projects/new');
  await press(session.page, 'more');
});

/** The reason that a field names as its description, if it stands just below the field. */
async function reasonBeside(page: Page, field: string): Promise<string | null> {
  const input = page.getByTestId(field);
  const id = await input.getAttribute('aria-describedby');
  if (id === null) return null;
  const reason = page.locator(`[id="${id}"]`);
  const [above, below] = [await input.boundingBox(), await reason.boundingBox()];
  if (!above || !below) return null;
  const gap = below.y - (above.y + above.height);
  return gap >= 0 && gap < 24 ? wordsOf(reason) : null;
}

it.each(['4¼', '4 1/4', '4.25', '17/4', '4 ¼ in'])(
  'plans strips of 4¼ in from "%s"',
  async (text) => {
    const { page } = session;
    await retype(page, 'stripHeight', text);
    await untilSays(page.getByTestId('result'), 'Cut strip height 4¼ in');
    await page.keyboard.press('Tab');
    expect(await page.getByTestId('stripHeight').getAttribute('aria-invalid')).toBe('false');
    await page.getByRole('button', { name: 'Back to the default, Strip height' }).click();
    await untilSays(page.getByTestId('result'), 'Cut strip height 5½ in');
  },
);

it.each([
  ['stripHeight', 'four', 'Not a length. Write 4 1/4, 4¼ or 4.25.', '5½'],
  ['seam', '0', 'Nothing would be left. Use more than 0.', '¼'],
  ['block', '-12', 'Nothing would be left. Use more than 0.', '16'],
  ['block', '3', 'Too small. Use 4 in or more.', '16'],
  ['wedges', '4', 'Too few. Use 5 or more.', '16'],
  ['wedges', '61', 'Too many. Use 60 or fewer.', '16'],
  ['stripHeight', '7', 'The plate is wider than its block.', '5½'],
])('refuses %s of "%s" with its reason beside the field', async (field, text, reason, good) => {
  const { page } = session;
  await retype(page, field, text);
  await page.keyboard.press('Tab');
  await until(async () => (await reasonBeside(page, field))?.startsWith(reason) ?? false, true);
  await untilSays(page.getByTestId('last-good'), 'This is the last plan that worked.');
  await press(page, 'make-plan');
  await until(() => titleOf(page), 'Plan the plates'); // nothing was made
  const focused = () => page.evaluate(() => document.activeElement?.getAttribute('data-testid'));
  await until(focused, field);
  await retype(page, field, good);
  await until(() => page.getByTestId('last-good').count(), 0);
});

it('keeps what was typed over a reload', async () => {
  const { page } = session;
  await retype(page, 'name', 'Half a name');
  await retype(page, 'block', '14 1/2');
  await page.reload();
  await until(() => page.getByTestId('name').inputValue(), 'Half a name');
  await until(() => page.getByTestId('block').inputValue(), '14 1/2');
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
