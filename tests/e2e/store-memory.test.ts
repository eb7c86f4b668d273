import { copyApp } from '../support/built-app';
import { openAt, untilSays } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { tapUpTo, untilCount } from '../support/e2e-station';
import { makeStation, openStation } from '../support/store-station';

// As in a private window: no file of one's own.
const app = copyApp('delete FileSystemFileHandle.prototype.createSyncAccessHandle;');
const session = openSession({ env: { WEB_DIST: app.folder } });
afterAll(app.remove);

/** What is counted later than this before a reload may be missing; the note on the page says so. */
const COPIED_WITHIN_MS = 1000;

it('counts without a private file system, says so, and has the count after a reload', async () => {
  const { page } = session;
  const station = await makeStation(page);
  await page.waitForTimeout(COPIED_WITHIN_MS);
  await openAt(page, '/projects');
  await untilSays(page.locator('body'), 'This browser gives no lasting storage.');
  await untilSays(page.locator('body'), 'a reload may lose the last second');
  await untilSays(page.getByTestId('saved-chip'), 'Kept in this browser only');
  await openStation(page, station, 0);
  await tapUpTo(page, 5);
  await page.waitForTimeout(COPIED_WITHIN_MS);
  await page.reload({ waitUntil: 'commit' });
  await untilCount(page, 5);
  await tapUpTo(page, 6);
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
