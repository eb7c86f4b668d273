import { execFileSync } from 'node:child_process';
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { Page } from 'playwright-core';

import {
  openAt,
  press,
  titleOf,
  until,
  untilReadyForOffline,
  untilSays,
} from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { tapZone, untilCount } from '../support/e2e-station';

const BUILT = process.env.WEB_DIST ?? 'dist';
const dist = mkdtempSync(path.join(tmpdir(), 'dist-'));
beforeAll(() => {
  cpSync(BUILT, dist, { recursive: true, filter: (file) => !/\.(br|gz)$/.test(file) });
});
const session = openSession({ env: { WEB_DIST: dist } });
afterAll(() => rmSync(dist, { recursive: true, force: true }));

/** A new build whose page differs by one element, and the service worker that goes with it. */
function release(name: string): void {
  const file = path.join(dist, 'index.html');
  const html = readFileSync(file, 'utf8').replace(/<meta name="release"[^>]*>/, '');
  writeFileSync(file, html.replace('<head>', `<head><meta name="release" content="${name}">`));
  const env = { ...process.env, WEB_DIST: dist, NODE_ENV: 'production' };
  execFileSync('npx', ['--no-install', 'webpack', '--config', 'webpack.sw.config.cjs'], { env });
}

const releaseOf = (page: Page): Promise<string | null> =>
  page.evaluate(
    () => document.querySelector('meta[name=release]')?.getAttribute('content') ?? null,
  );

/** What a browser does by itself from time to time; waits until the new release lies ready. */
async function lookForRelease(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const registration = await navigator.serviceWorker.getRegistration();
    await registration?.update();
  });
  const waits = () =>
    page.evaluate(async () => Boolean((await navigator.serviceWorker.getRegistration())?.waiting));
  await until(waits, true);
}

let second: Page;

it('keeps a new release back while she counts at a station', async () => {
  const { page } = session;
  await openAt(page, '/');
  await untilReadyForOffline(page);
  await press(page, 'open-example');
  await press(page, 'carry-on-go');
  await press(page, 'check-skip');
  await tapZone(page);
  await untilCount(page, 28);
  second = await session.browser.newPage();
  await openAt(second, '/projects/new');
  release('second');
  await lookForRelease(page);
  await tapZone(page);
  await untilCount(page, 32);
  await page.waitForTimeout(6000); // the notice looks every five seconds whether it may show
  expect(await page.getByTestId('update').count()).toBe(0);
});

it('offers it when she leaves the station, and takes both tabs over when asked', async () => {
  const { page } = session;
  await page.bringToFront();
  await press(page, 'back');
  await until(() => titleOf(page), 'Ready');
  await untilSays(page.locator('body'), 'A new Matside is here.');
  expect([await releaseOf(page), await releaseOf(second)]).toEqual([null, null]);
  await press(page, 'update');
  await until(() => releaseOf(page).catch(() => null), 'second');
  await until(() => releaseOf(second).catch(() => null), 'second');
});

it('has every count after the change, in both tabs', async () => {
  for (const tab of [session.page, second]) {
    await openAt(tab, '/');
    await untilSays(tab.getByTestId('carry-on'), '32 of 48 pieces cut');
  }
});

it('comes back later when asked to wait', async () => {
  const { page } = session;
  release('third');
  await lookForRelease(page);
  await press(page, 'update-later');
  await until(() => page.getByTestId('update').count(), 0);
  expect(await releaseOf(page)).toBe('second');
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
