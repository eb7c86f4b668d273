import type { BrowserContext } from 'playwright-core';

import { BASE_URL } from '../support/server-process';
import { percentile, type Figure } from './report';

const MOST_MS = 400;
const PATIENCE_MS = 60_000;

/** From the navigation to the frame that shows "Carry on", in a tab of its own each time. */
export async function timeStarts(browser: BrowserContext, starts: number): Promise<number[]> {
  const times: number[] = [];
  while (times.length < starts) {
    const page = await browser.newPage();
    await page.goto(`${BASE_URL}/`, { waitUntil: 'commit', timeout: PATIENCE_MS });
    await page.getByTestId('carry-on-go').waitFor({ timeout: PATIENCE_MS });
    await page.waitForTimeout(300); // the frame after it, and what is still being loaded
    times.push(await page.evaluate(() => window.usableMs));
    await page.close();
  }
  return times;
}

export function startFigures(name: string, times: readonly number[], judged: boolean): Figure[] {
  return [
    { name: `${name}, median of ${times.length}`, value: percentile(times, 0.5), unit: 'ms' },
    {
      name: `${name}, p95`,
      value: percentile(times, 0.95),
      unit: 'ms',
      ...(judged && { most: MOST_MS }),
    },
  ];
}
