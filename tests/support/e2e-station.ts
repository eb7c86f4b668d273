import { setTimeout as sleep } from 'node:timers/promises';

import type { Locator, Page } from 'playwright-core';

import { openAt, press, retype, until, untilSays, wordsOf } from './e2e-page';

/** After a count the next one counts from 180 ms on; a little more, as a hand needs. */
const NEXT_TAP_MS = 195;

/** The big number of a station, read from the screen. */
export async function countOf(page: Page): Promise<number> {
  return Number(await wordsOf(page.getByTestId('tally-number')));
}

export const untilCount = (page: Page, count: number): Promise<void> =>
  until(() => countOf(page), count);

export const untilZoneSays = (page: Page, words: string): Promise<void> =>
  untilSays(page.getByTestId('tally'), words);

async function middleOf(place: Locator): Promise<{ x: number; y: number }> {
  const box = await place.boundingBox();
  if (!box) throw new Error('it is not on the screen');
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
}

/** Presses the big zone once, with the mouse, and no sooner than the next press would count. */
export async function tapZone(page: Page): Promise<void> {
  const { x, y } = await middleOf(page.getByTestId('tally'));
  await page.mouse.click(x, y);
  await sleep(NEXT_TAP_MS);
}

/** Presses a key that counts or takes back, no sooner than the next one would count. */
export async function pressKey(page: Page, key: string): Promise<void> {
  await page.keyboard.press(key);
  await sleep(NEXT_TAP_MS);
}

/** Taps, and after each tap reads the new count from the screen. */
export async function tapUpTo(page: Page, count: number, perTap = 1): Promise<void> {
  for (let now = await countOf(page); now < count; now += perTap) {
    await tapZone(page);
    await untilCount(page, now + perTap);
  }
}

/** Sets an exact count, in pieces of the lane in hand, with the keypad. */
export async function setByKeypad(page: Page, pieces: number): Promise<void> {
  await press(page, 'keypad');
  await retype(page, 'keypad-field', String(pieces));
  await press(page, 'keypad-yes');
  await page.getByTestId('keypad-dialog').waitFor({ state: 'detached' });
}

/** Goes to another step through the list of all steps. */
export async function goToStep(page: Page, role: string): Promise<void> {
  await press(page, 'steps');
  await page.getByTestId('steps-sheet').getByTestId(`step-${role}`).click();
  await page.getByTestId('steps-sheet').waitFor({ state: 'detached' });
}

/** Goes to a step and counts it to its target by taps. */
export async function makeAll(page: Page, role: string, count: number): Promise<void> {
  await goToStep(page, role);
  await tapUpTo(page, count);
}

const CHECKS = ['blade', 'away', 'fingers', 'shoes', 'children', 'mat', 'height'];

/** Ticks the seven lines of the check before cutting. */
export async function tickAllChecks(page: Page): Promise<void> {
  for (const [at, check] of CHECKS.entries()) {
    await untilSays(page.getByTestId('safety-check'), `${at} of ${CHECKS.length}`);
    await press(page, `check-${check}`);
  }
  await untilSays(page.getByTestId('check-start'), 'Start cutting');
  await press(page, 'check-start');
}

/**
 * Opens a station on a new cutting visit: half an hour went by since the last. A browser that was
 * killed may not have written its last visit down, so one is written here in any case.
 */
export async function comeBackAfterHalfAnHour(page: Page, address: string): Promise<void> {
  await page.evaluate(() => {
    const kept = localStorage.getItem('matside.cuttingVisit');
    const visit = JSON.parse(kept ?? '{"opened":"checked","adult":false}') as object;
    const before = { ...visit, lastSeenAtMs: Date.now() - 31 * 60_000 };
    localStorage.setItem('matside.cuttingVisit', JSON.stringify(before));
  });
  await openAt(page, address);
}

/** What is asked or told over the page: its title, then its words. */
export const dialogOf = (page: Page): Locator => page.getByRole('dialog');
