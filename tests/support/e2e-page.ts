import { setTimeout as sleep } from 'node:timers/promises';

import type { Locator, Page } from 'playwright-core';

import { BASE_URL } from './server-process';

const PATIENCE_MS = 30_000;
const LOOK_EVERY_MS = 20;

/** Looks again and again until it reads what is wanted; then, or in the end, asserts it. */
export async function until<Value>(read: () => Promise<Value>, wanted: Value): Promise<void> {
  const end = performance.now() + PATIENCE_MS;
  const wantedText = JSON.stringify(wanted);
  for (;;) {
    const value = await read();
    if (JSON.stringify(value) === wantedText || performance.now() > end) {
      expect(value).toEqual(wanted);
      return;
    }
    await sleep(LOOK_EVERY_MS);
  }
}

/** The words on the screen, in one line; built fractions as "1⅝" would be written: "1 5⁄8". */
export async function wordsOf(place: Locator): Promise<string> {
  const text = await place.innerText({ timeout: PATIENCE_MS });
  return text
    .replace(/\s+/g, ' ')
    .replace(/\s*⁄\s*/g, '⁄')
    .trim();
}

/** Waits until the place says this, among other things. */
export async function untilSays(place: Locator, words: string): Promise<void> {
  const end = performance.now() + PATIENCE_MS;
  for (;;) {
    const text = await wordsOf(place).catch(() => '(not there)');
    if (text.includes(words) || performance.now() > end) {
      expect(text).toContain(words);
      return;
    }
    await sleep(LOOK_EVERY_MS);
  }
}

export const titleOf = (page: Page): Promise<string> =>
  wordsOf(page.getByRole('heading', { level: 1 }));

/** Opens an address of the app as from a bookmark. */
export async function openAt(page: Page, address: string): Promise<void> {
  await page.goto(`${BASE_URL}${address}`, { waitUntil: 'commit', timeout: PATIENCE_MS });
  await page.getByRole('heading', { level: 1 }).waitFor({ timeout: PATIENCE_MS });
}

/** Presses what carries this test id. */
export async function press(page: Page, id: string): Promise<void> {
  await page.getByTestId(id).click({ timeout: PATIENCE_MS });
}

/** Puts other words into a field, key by key. */
export async function retype(page: Page, id: string, text: string): Promise<void> {
  await press(page, id);
  await page.keyboard.press('Control+A');
  await page.keyboard.press('Delete');
  await page.keyboard.type(text);
}

/** Presses Tab until what carries this test id, or lies in it, has the focus. */
export async function tabTo(page: Page, id: string): Promise<void> {
  const wanted = `[data-testid="${id}"]`;
  for (let turn = 0; turn < 120; turn += 1) {
    await page.keyboard.press('Tab');
    const there = await page.evaluate(
      (selector) => document.activeElement?.closest(selector) !== null,
      wanted,
    );
    if (there) return;
  }
  throw new Error(`Tab never came to ${id}`);
}

/** Waits until everything needed without a network is on the device. */
export async function untilReadyForOffline(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const { active } = await navigator.serviceWorker.ready;
    if (active?.state === 'activated') return;
    await new Promise((resolve) => active?.addEventListener('statechange', resolve));
  });
}
