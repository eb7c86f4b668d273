import type { Page } from 'playwright-core';

import { newId } from '../../sync/client/new-id';
import { askStore } from '../support/demo-store';
import { openAt, until } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { countOf, tapUpTo, tapZone, untilCount } from '../support/e2e-station';
import { BASE_URL } from '../support/server-process';
import { makeStation, openStation, request } from '../support/store-station';

const session = openSession();
const BALLAST = 'x'.repeat(16_000);

async function limitRoom(page: Page, quotaSize?: number): Promise<void> {
  const debug = await session.browser.newCDPSession(page);
  const limit = quotaSize === undefined ? {} : { quotaSize };
  await debug.send('Storage.overrideQuotaForOrigin', { origin: BASE_URL, ...limit });
}

/** Writes until there is no room left: Chromium gives a file its room by the megabyte. */
async function fillUp(page: Page): Promise<void> {
  const id = newId(Date.now());
  await askStore(page, [{ do: 'create', id, name: 'Ballast', note: '', request }]);
  await limitRoom(page, 1);
  for (let turn = 0; turn < 500; turn += 1) {
    const more = askStore(page, [{ do: 'rename', id, name: `${turn}${BALLAST}` }]);
    const refusal = await more.then(
      () => null,
      (error: Error) => error.message,
    );
    if (refusal === null) continue;
    expect(refusal).toContain('storage-full');
    return;
  }
  throw new Error('it was never full');
}

/** A tap is small: a few more may find room. @returns the count that stands then */
async function tapUntilRefused(page: Page): Promise<number> {
  const refused = page.getByText('Not counted. This device is full.');
  for (let count = await countOf(page); count < 40; count += 1) {
    await tapZone(page);
    await until(async () => (await refused.count()) + (await countOf(page)) > count, true);
    if ((await refused.count()) === 0) continue;
    expect(await countOf(page)).toBe(count);
    return count;
  }
  throw new Error('no tap was refused');
}

it('says that the device is full, keeps every count, and goes on when there is room', async () => {
  const { page } = session;
  const station = await makeStation(page);
  await openStation(page, station, 0);
  await tapUpTo(page, 3);
  await fillUp(page);
  const kept = await tapUntilRefused(page);
  await page.reload({ waitUntil: 'commit' });
  await page.getByTestId('tally-number').waitFor();
  await untilCount(page, kept);
  await limitRoom(page);
  await tapUpTo(page, kept + 2);
  await until(() => page.getByText('This device is full').count(), 0);
  await openAt(page, station);
  await untilCount(page, kept + 2);
});
