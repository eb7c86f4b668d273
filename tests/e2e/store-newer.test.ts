import type { Page } from 'playwright-core';

import { SCHEMA_VERSION } from '../../sync/store/migrate';
import { workerAddress } from '../support/built-app';
import { openAt, untilSays } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { tapUpTo } from '../support/e2e-station';
import { BASE_URL } from '../support/server-process';
import { makeStation, openStation } from '../support/store-station';

const session = openSession();

/** Runs SQL on the app's own file, with the app's own worker, beside the app. */
async function runSql(page: Page, sql: string): Promise<void> {
  await page.goto(`${BASE_URL}/api/health`); // a page of the same origin without the app
  await page.evaluate(inWorker, { address: workerAddress(), sql });
}

/** Runs in the page. */
async function inWorker({ address, sql }: { address: string; sql: string }): Promise<void> {
  const worker = new Worker(address);
  const open = { nativeDatabaseId: 0, databasePath: './matside.db', options: {} };
  const steps = [
    { type: 'open', data: open },
    { type: 'exec', data: { nativeDatabaseId: 0, source: sql } },
    { type: 'close', data: { nativeDatabaseId: 0 } },
  ];
  for (const [id, step] of steps.entries()) {
    await new Promise<void>((resolve, reject) => {
      worker.onerror = () => reject(new Error('no worker'));
      worker.onmessage = ({ data }) => (data.error ? reject(data.error) : resolve());
      worker.postMessage({ id, isSync: false, ...step });
    });
  }
  worker.terminate();
}

const setSchema = (page: Page, version: number): Promise<void> =>
  runSql(
    page,
    `PRAGMA locking_mode = EXCLUSIVE; PRAGMA journal_mode = WAL; PRAGMA user_version = ${version}`,
  );

it('refuses what a newer build wrote, says to reload, and leaves it as it is', async () => {
  const { page } = session;
  const station = await makeStation(page);
  await openStation(page, station, 0);
  await tapUpTo(page, 2);
  await setSchema(page, SCHEMA_VERSION + 1);
  await openAt(page, '/projects');
  await untilSays(page.locator('body'), 'This page is an older Matside');
  await untilSays(page.locator('body'), 'Reload to get it; nothing is lost.');
  expect(await page.getByRole('button', { name: 'Reload' }).isVisible()).toBe(true);
});

it('holds nothing of it: another tab opens the file, and the refused one shows what that one has', async () => {
  const other = await session.browser.newPage();
  await setSchema(other, SCHEMA_VERSION);
  await openAt(other, '/projects');
  await untilSays(other.locator('body'), 'Lighthouse');
  await untilSays(session.page.locator('body'), '2 of 160 pairs sewn');
});
