import type { Page } from 'playwright-core';

import { openAt, untilSays } from '../support/e2e-page';
import { openSession } from '../support/e2e-session';
import { tapUpTo, untilCount } from '../support/e2e-station';
import { makeStation, openStation } from '../support/store-station';

const session = openSession();
let station = '';
let leader: Page;

beforeAll(async () => {
  leader = session.page;
  station = await makeStation(leader);
  await openStation(leader, station, 0);
});

it.each([0, 4, 8])(
  'loses no tap of another tab when the leading tab closes during one, from %i',
  async (start) => {
    const follower = await session.browser.newPage();
    await openStation(follower, station, start);
    await follower.bringToFront();
    await tapUpTo(follower, start + 2);
    await untilCount(leader, start + 2);
    await Promise.all([follower.getByTestId('tally').click(), leader.close()]);
    await untilCount(follower, start + 3);
    await tapUpTo(follower, start + 4);
    await follower.reload({ waitUntil: 'commit' });
    await untilCount(follower, start + 4);
    leader = follower;
  },
);

it('says which tab holds the data', async () => {
  const second = await session.browser.newPage();
  await openAt(second, '/me');
  await untilSays(second.getByTestId('fact-storage'), 'through another tab');
  await second.close();
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
