import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { Page } from 'playwright-core';

import { DESK, killBrowser, openBrowser, PHONE } from '../support/chromium';
import { makeDemo, openExample, type Demo } from '../support/demo-projects';
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
const STILL = { reducedMotion: 'reduce', colorScheme: 'light' } as const;
const THEMES = { day: 'light', lamp: 'dark' } as const;

async function takeAll(page: Page): Promise<void> {
  const nothing = { circle: '', hole: '' };
  for (const screen of EMPTY_SCREENS) await takeScreen(page, screen, nothing);
  const demo = await makeDemo(page);
  for (const screen of SCREENS) await takeScreen(page, screen, demo);
}

/** With the example alone, as a reader of README finds it. */
async function takeForReadme(page: Page, folder: string): Promise<void> {
  const demo = { circle: await openExample(page), hole: '' };
  for (const { file, screen, size } of README_SHOTS) {
    const shown = SCREENS.find(({ name }) => name === screen);
    await page.emulateMedia(STILL);
    await page.setViewportSize(size);
    await shown?.reach(page, demo);
    await take(page, path.join(folder, `${file}.png`));
  }
}

/** Both sizes in both themes. */
async function takeScreen(page: Page, screen: DemoScreen, demo: Demo): Promise<void> {
  const { name, reach, leave, foldsUp } = screen;
  for (const [at, [kind, size]] of Object.entries(SIZES).entries()) {
    await page.emulateMedia(STILL);
    await page.setViewportSize(size);
    if (at === 0 || foldsUp) {
      if (at > 0) await leave?.(page);
      await reach(page, demo);
    }
    for (const [theme, colorScheme] of Object.entries(THEMES)) {
      await page.emulateMedia({ colorScheme });
      await take(page, path.join(FOLDER, `${name}-${kind}-${theme}.png`));
    }
  }
  await leave?.(page);
}

async function take(page: Page, file: string): Promise<void> {
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
    const [page = await browser.newPage()] = browser.pages();
    await (README ? takeForReadme(page, README) : takeAll(page));
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
