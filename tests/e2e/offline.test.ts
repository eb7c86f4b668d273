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
import { startServer, stopServer } from '../support/server-process';

const session = openSession();
let home = '';

beforeAll(async () => {
  const { page } = session;
  await openAt(page, '/');
  await press(page, 'open-example');
  await untilSays(page.getByTestId('carry-on'), 'Harbour Lights');
  await openAt(page, '/projects');
  await page.getByTestId('project-line').filter({ hasText: 'Harbour Lights' }).click();
  await until(() => titleOf(page), 'Harbour Lights');
  home = new URL(page.url()).pathname;
  await untilReadyForOffline(page);
  await stopServer();
  await session.browser.setOffline(true);
});

const FONTS = ['Atkinson500', 'Atkinson600', 'Atkinson700', 'YoungSerif400'];

/** The families the device has, the Latin ones and their extensions together. */
const loadedFonts = (page: Page): Promise<string[]> =>
  page.evaluate(async () => {
    await document.fonts.ready;
    const loaded = [...document.fonts].filter(({ status }) => status === 'loaded');
    const families = loaded.map(({ family }) => family.replaceAll('"', '').replace(/Ext$/, ''));
    return [...new Set(families)].sort();
  });

it.each([
  ['/', 'Ready'],
  ['/projects', 'Projects'],
  ['/projects/new', 'Plan the plates'],
  ['<project>', 'Harbour Lights'],
  ['<project>/plan', 'The plan'],
  ['<project>/table?step=cut', 'Before you cut'],
  ['<project>/machine?step=pair', 'Chain piece pairs'],
  ['<project>/iron?step=tip-turn', 'Turn the tips and press them'],
  ['/me', 'Me'],
  ['/me/safety', 'Safety'],
  ['/first-aid', 'If someone is cut'],
  ['/nowhere', 'Nothing here'],
])(
  'opens %s from a bookmark and reloads it, with no server and no network',
  async (route, title) => {
    const { page } = session;
    await openAt(page, route.replace('<project>', home));
    await until(() => titleOf(page), title);
    await page.reload({ waitUntil: 'commit' });
    await until(() => titleOf(page), title);
  },
);

it('has its fonts, its figures and its counts', async () => {
  const { page } = session;
  await openAt(page, '/projects/new');
  await untilSays(page.getByTestId('result'), 'Wedges a strip 17');
  await until(() => loadedFonts(page), FONTS);
  await openAt(page, `${home}/table?step=cut`);
  await press(page, 'check-skip');
  await untilCount(page, 24);
  await tapZone(page);
  await untilCount(page, 28);
  await page.reload({ waitUntil: 'commit' });
  await untilCount(page, 28);
});

it('says calmly that the server does not answer, and that it does when it is back', async () => {
  const { page } = session;
  await openAt(page, '/me');
  const server = page.getByTestId('fact-server');
  await untilSays(server, 'Everything here works without it.');
  await startServer();
  await session.browser.setOffline(false);
  await page.reload({ waitUntil: 'commit' });
  await untilSays(server, 'Answers');
});

it('never complains', () => {
  expect(session.complaints).toEqual([]);
});
