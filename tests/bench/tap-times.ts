import { setTimeout as sleep } from 'node:timers/promises';

import type { Page } from 'playwright-core';

import { percentile, type Figure } from './report';
import type { TapTimes } from './watch-page';

const BETWEEN_MS = 200; // a count needs 180 ms after the one before
const SPREAD_MS = 17; // so that no tap falls always on the same place of a frame
const PATIENCE_MS = 10_000;
const MOST_MS = 10;

/** Presses the pedal's key so many times, and takes the times that the page itself noted. */
export async function timeTaps(page: Page, taps: number): Promise<TapTimes[]> {
  await page.bringToFront();
  for (let made = 0; made < taps; made += 1) {
    await page.keyboard.press('PageDown');
    await sleep(BETWEEN_MS + (made % SPREAD_MS));
    const shown = await page.evaluate(() => window.tapTimes.length);
    if (shown <= made) await untilShown(page, made + 1);
  }
  return page.evaluate(() => window.tapTimes);
}

async function untilShown(page: Page, taps: number): Promise<void> {
  await page.waitForFunction((wanted) => window.tapTimes.length >= wanted, taps, {
    timeout: PATIENCE_MS,
  });
}

/** Median and 95th of a hundred, of what lies between the key and the number in the DOM. */
export function tapFigures(tab: string, taps: readonly TapTimes[]): Figure[] {
  const shown = taps.map((tap) => tap.shown - tap.pressed);
  const heard = taps.map((tap) => tap.shown - tap.heard);
  const painted = taps.filter((tap) => tap.painted > 0).map((tap) => tap.painted - tap.shown);
  return [
    { name: `${tab}: taps measured`, value: taps.length, unit: '' },
    { name: `${tab}: key → committed → DOM, median`, value: percentile(shown, 0.5), unit: 'ms' },
    { name: `${tab}: the same, p95`, value: percentile(shown, 0.95), unit: 'ms', most: MOST_MS },
    { name: `${tab}: of it in the page, median`, value: percentile(heard, 0.5), unit: 'ms' },
    { name: `${tab}: of it in the page, p95`, value: percentile(heard, 0.95), unit: 'ms' },
    { name: `${tab}: then to the paint, median`, value: percentile(painted, 0.5), unit: 'ms' },
    { name: `${tab}: then to the paint, p95`, value: percentile(painted, 0.95), unit: 'ms' },
  ];
}
