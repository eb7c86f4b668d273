import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { BrowserContext, Page } from 'playwright-core';

import { DESK, killBrowser, openBrowser, PHONE } from '../support/chromium';
import { makeDemo, type Demo } from '../support/demo-projects';
import { EMPTY_SCREENS, SCREENS, type DemoScreen } from '../support/demo-screens';
import { settle } from '../support/measure-page';
import { startServer, stopServer } from '../support/server-process';

const FOLDER = process.env.SCREENS ?? '.cache/screens';
/** The four of README: their names there, and where they are among the screens. */
const README = process.env.SCREENS_README;
const README_SHOTS = [
  { file: 'ready-phone', screen: 'ready', size: PHONE },
  { file: 'table-phone', screen: 'step-cut', size: PHONE },
  { file: 'plan-wide', screen: 'plan', size: DESK },
  { file: 'table-wide', screen: 'step-cut', size: DESK },
];
const SIZES = { phone: PHONE, wide: DESK };
const THEMES = { day: 'light', lamp: 'dark' } as const;

async function takeAll(browser: BrowserContext): Promise<void> {
  const [page = await browser.newPage()] = browser.pages();
  const demo: Demo = { circle: '', hole: '' };
  if (!README) for (const screen of EMPTY_SCREENS) await takeScreen(page, screen, demo);
  Object.assign(demo, await makeDemo(page));
  for (const screen of README ? [] : SCREENS) await takeScreen(page, screen, demo);
  for (const { file, screen, size } of README ? README_SHOTS : []) {
    const shown = SCREENS.find(({ name }) => name === screen);
    await begin(page);
    await shown?.reach(page, demo);
    await take(page, size, path.join(README ?? FOLDER, `${file}.png`));
  }
}

/** Both sizes in both themes, of one visit. */
async function takeScreen(page: Page, { name, reach, leave }: DemoScreen, demo: Demo) {
  await begin(page);
  await reach(page, demo);
  for (const [theme, colorScheme] of Object.entries(THEMES)) {
    for (const [kind, size] of Object.entries(SIZES)) {
      await page.emulateMedia({ colorScheme });
      await take(page, size, path.join(FOLDER, `${name}-${kind}-${theme}.png`));
    }
  }
  await page.setViewportSize(PHONE);
  await leave?.(page);
}

async function begin(page: Page): Promise<void> {
  await page.emulateMedia({ reducedMotion: 'reduce', colorScheme: 'light' });
  await page.setViewportSize(PHONE);
}

async function take(page: Page, size: typeof PHONE, file: string): Promise<void> {
  await page.setViewportSize(size);
  await settle(page);
  await page.screenshot({ path: file });
  console.log(file);
}

async function main(): Promise<void> {
  const profile = mkdtempSync(path.join(tmpdir(), 'screens-'));
  mkdirSync(README ?? FOLDER, { recursive: true });
  await startServer();
  try {
    const browser = await openBrowser(profile, []);
    await takeAll(browser);
    await browser.close();
  } finally {
    killBrowser(profile);
    await stopServer();
    rmSync(profile, { recursive: true, force: true, maxRetries: 5 });
  }
}

void main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
