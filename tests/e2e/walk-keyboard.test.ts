import { DESK } from '../support/chromium';
import { openAt, tabTo, titleOf, until, untilSays } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { countOf, dialogOf, pressKey, untilCount } from '../support/e2e-station';

// A wide screen and no pointer at all.
const session = openSession({ viewport: DESK });
const key = (name: string) => pressKey(session.page, name);

/** Goes with Tab to what carries the test id, and presses Enter there. */
async function enter(id: string): Promise<void> {
  await tabTo(session.page, id);
  await session.page.keyboard.press('Enter');
}

const focused = () =>
  session.page.evaluate(() => document.activeElement?.getAttribute('data-testid') ?? null);

it('opens the example from Ready, and a project from there', async () => {
  const { page } = session;
  await openAt(page, '/');
  await enter('open-example');
  await untilSays(page.getByTestId('carry-on'), 'Harbour Lights');
  await untilSays(page.getByTestId('carry-on'), '24 of 48 pieces cut');
  await enter('carry-on-go');
  await until(() => titleOf(page), 'Before you cut');
});

it('counts while the safety check shows, and ticks or skips it after Tab', async () => {
  const { page } = session;
  await key('Space');
  await untilSays(page.getByTestId('check-count'), '28 of 48 pieces cut');
  await tabTo(page, 'check-blade');
  await page.keyboard.press('Space');
  await untilSays(page.getByTestId('safety-check'), '1 of 7');
  await untilSays(page.getByTestId('check-count'), '28 of 48 pieces cut');
  await enter('check-skip');
  await untilCount(page, 28);
});

it('shows the steps and the work side by side', async () => {
  const { page } = session;
  const steps = await page.getByRole('list', { name: 'All steps' }).boundingBox();
  const work = await page.getByRole('main').boundingBox();
  const zone = await page.getByTestId('tally').boundingBox();
  if (!steps || !work || !zone) throw new Error('a pane is not on the screen');
  expect(steps.x + steps.width).toBeLessThanOrEqual(work.x);
  expect(zone.x).toBeGreaterThan(work.x);
  expect(zone.x + zone.width).toBeLessThanOrEqual(DESK.width);
  expect(zone.height).toBeGreaterThanOrEqual(DESK.height * 0.4);
});

it('counts with Space, Enter, PageDown and the right arrow, and takes back with Backspace', async () => {
  const { page } = session;
  for (const [at, name] of ['Space', 'Enter', 'PageDown', 'ArrowRight'].entries()) {
    await key(name);
    await untilCount(page, 32 + 4 * at);
  }
  await key('Backspace');
  await untilCount(page, 40);
  await untilSays(page.locator('body'), 'Took back 4. Now 40.');
});

it('opens and closes the keypad, which answers only after Tab', async () => {
  const { page } = session;
  await enter('keypad');
  await untilSays(dialogOf(page), 'How many pieces are cut?');
  for (const name of ['Space', 'Enter', 'PageDown', 'Backspace']) await page.keyboard.press(name);
  await untilSays(dialogOf(page), 'How many pieces are cut?');
  await page.keyboard.press('Escape');
  await dialogOf(page).waitFor({ state: 'detached' });
  await until(focused, 'keypad');
  await untilCount(page, 40);
  await enter('keypad');
  await tabTo(page, 'keypad-field');
  await page.keyboard.press('Control+A');
  await page.keyboard.type('44');
  await enter('keypad-yes');
  await untilCount(page, 44);
});

it('changes the step and the lane, and counts there', async () => {
  const { page } = session;
  await enter('step-tip-sew');
  await until(() => titleOf(page), 'Sew the tips in a chain');
  const before = await countOf(page);
  await enter('lane-C');
  await until(() => page.getByTestId('lane-C').getAttribute('aria-pressed'), 'true');
  await key('PageDown');
  await untilCount(page, before + 1);
  await untilSays(page.getByTestId('lane-C'), 'C 1');
  await enter('undo');
  await untilCount(page, before);
});

it('asks about a miscut, and takes it off only after Tab', async () => {
  const { page } = session;
  await enter('step-cut');
  await untilCount(page, 44);
  await enter('loss');
  await untilSays(dialogOf(page), 'Which piece was miscut?');
  await page.keyboard.press('Enter');
  await tabTo(page, 'item-wedge:A');
  await page.keyboard.press('Enter');
  await enter('loss-yes');
  await untilSays(dialogOf(page), '43 good, 1 to recut');
  await page.keyboard.press('Enter');
  await untilSays(dialogOf(page), '43 good, 1 to recut');
  await enter('recut-ok');
  await untilCount(page, 43);
});

it('goes back to the places', async () => {
  const { page } = session;
  await enter('back');
  await until(() => titleOf(page), 'Ready');
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
