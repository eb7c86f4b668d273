import type { Page } from 'playwright-core';

import { openAt, press, retype, titleOf, until, untilSays } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { fillInFivePlates, makeProject } from '../support/e2e-setup';
import { countOf, dialogOf, tapZone, untilCount, untilZoneSays } from '../support/e2e-station';

const session = openSession();
let home = '';

beforeAll(async () => {
  await openAt(session.page, '/projects/new');
  await fillInFivePlates(session.page);
  home = await makeProject(session.page, 'By hand');
});

/** A pedal is a keyboard with a key or two. */
async function stepOnPedal(page: Page): Promise<void> {
  for (const key of ['Space', 'Enter', 'PageDown', 'ArrowRight']) await page.keyboard.press(key);
}

it('counts by pedal while the safety check shows, which a pedal cannot answer', async () => {
  const { page } = session;
  await openAt(page, `${home}/table?step=strip`);
  await untilSays(page.getByTestId('check-count'), '0 of 5 strips cut');
  await page.keyboard.press('PageDown');
  await untilSays(page.getByTestId('check-count'), '1 of 5 strips cut');
  await untilSays(page.getByTestId('safety-check'), '0 of 7');
  await press(page, 'check-skip');
  await untilCount(page, 1);
});

it('counts a key that is held down once', async () => {
  const { page } = session;
  for (let turn = 0; turn < 12; turn += 1) await page.keyboard.down('Space');
  await page.keyboard.up('Space');
  await untilCount(page, 2);
  await page.waitForTimeout(400); // longer than a count could take to follow
  expect(await countOf(page)).toBe(2);
});

it('counts two fingers of one hand once', async () => {
  const { page } = session;
  const box = await page.getByTestId('tally').boundingBox();
  if (!box) throw new Error('the zone is not on the screen');
  const finger = (part: number) => ({ x: box.x + box.width * part, y: box.y + box.height / 2 });
  const one = { ...finger(0.3), id: 1 };
  const two = { ...finger(0.7), id: 2 };
  const hand = await session.browser.newCDPSession(page);
  const touch = (type: 'touchStart' | 'touchEnd', touchPoints: (typeof one)[]) =>
    hand.send('Input.dispatchTouchEvent', { type, touchPoints });
  await Promise.all([touch('touchStart', [one]), touch('touchStart', [one, two])]);
  await Promise.all([touch('touchEnd', [one]), touch('touchEnd', [])]);
  await untilCount(page, 3);
  await page.waitForTimeout(400);
  expect(await countOf(page)).toBe(3);
});

it('counts a finger, and opens the keypad when it is held', async () => {
  const { page } = session;
  await page.getByTestId('tally').tap();
  await untilCount(page, 4);
  await page.getByTestId('tally').hover();
  await page.mouse.down();
  await untilSays(dialogOf(page), 'How many strips are cut?');
  await page.mouse.up();
  await press(page, 'keypad-no');
  await untilCount(page, 4);
});

it('asks over the target, and a pedal neither counts nor answers until Tab', async () => {
  const { page } = session;
  await tapZone(page);
  await untilCount(page, 5);
  await page.keyboard.press('Space');
  await untilSays(dialogOf(page), '6 of 5 strips. Count it?');
  await stepOnPedal(page);
  await untilSays(dialogOf(page), '6 of 5 strips. Count it?');
  expect(await countOf(page)).toBe(5);
  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter'); // the first answer keeps what stands
  await dialogOf(page).waitFor({ state: 'detached' });
  expect(await countOf(page)).toBe(5);
});

it('asks at a jump of more than three stacks, and sets a count between two cuts to neither', async () => {
  const { page } = session;
  await openAt(page, `${home}/table?step=cut`);
  await press(page, 'keypad');
  await retype(page, 'keypad-field', '62');
  await untilSays(dialogOf(page), 'One tap is 5, so it is one of these.');
  await press(page, 'keypad-60');
  await untilSays(dialogOf(page), 'Waiting for 5 stacks'); // nothing was stacked yet
  await press(page, 'count-no');
  await press(page, 'keypad');
  await retype(page, 'keypad-field', '80');
  await press(page, 'keypad-yes');
  await untilSays(dialogOf(page), '80 pieces more, 4 stacks at once. Count it?');
  await press(page, 'count-yes');
  await untilCount(page, 80);
});

it('finds the end of the circle strip for a miscut in B', async () => {
  const { page } = session;
  await press(page, 'loss');
  await press(page, 'item-wedge:B');
  await press(page, 'loss-yes');
  await untilSays(dialogOf(page), '79 good, 1 to recut');
  await untilSays(dialogOf(page), 'Cut it from the 17 × 5 in left of the circle strip.');
  await press(page, 'recut-ok');
  await press(page, 'undo');
  await untilCount(page, 80);
});

it('counts nothing while locked, and is unlocked by holding', async () => {
  const { page } = session;
  await press(page, 'lock');
  await untilZoneSays(page, 'Hold to unlock');
  await tapZone(page);
  await stepOnPedal(page);
  expect(await page.getByTestId('undo').isDisabled()).toBe(true);
  expect(await countOf(page)).toBe(80);
  await page.getByTestId('tally').hover();
  await page.mouse.down();
  await untilZoneSays(page, '5 a tap');
  await page.mouse.up();
  expect(await countOf(page)).toBe(80);
  await tapZone(page);
  await untilCount(page, 85);
});

it('keeps the screen awake, and says so', async () => {
  const awake = session.page.getByTestId('awake');
  await untilSays(awake, 'Awake');
  await until(() => awake.getAttribute('aria-pressed'), 'true');
  await awake.click();
  await untilSays(awake, 'May sleep');
  await until(() => awake.getAttribute('aria-pressed'), 'false');
});

it('turns to Lamp, and stays so', async () => {
  const { page } = session;
  const paper = () =>
    page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
  await openAt(page, '/me');
  await until(paper, 'rgb(245, 237, 223)');
  await page.getByTestId('theme').getByText('Lamp').click();
  await until(paper, 'rgb(23, 19, 14)');
  await page.reload();
  await until(paper, 'rgb(23, 19, 14)');
});

it.each(['/projects/not-a-project', '/projects/not-a-project/table?step=cut', '/no/such/page'])(
  'offers a way on from %s',
  async (address) => {
    const { page } = session;
    await openAt(page, address);
    await page.getByRole('button', { name: /Ready|All projects/ }).click();
    await until(async () => /^(Ready|Projects)$/.test(await titleOf(page)), true);
  },
);

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
