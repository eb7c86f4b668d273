import { readdirSync } from 'node:fs';
import path from 'node:path';

import { runAxe } from '../support/axe';
import { DESK, PHONE } from '../support/chromium';
import { makeDemo, type Demo } from '../support/demo-projects';
import { EMPTY_SCREENS, SCREENS, type DemoScreen } from '../support/demo-screens';
import { openSession } from '../support/e2e-session';
import { findOverflow, findSmallTargets, settle } from '../support/measure-page';

const SIDEWAYS = { width: 844, height: 390 };
const NARROW = { width: 320, height: 844 };
const SIZES = { phone: PHONE, wide: DESK };
const THEMES = { Day: 'light', Lamp: 'dark' } as const;

const session = openSession();
const demo: Demo = { circle: '', hole: '' };
let unsure = 0;

afterAll(() => {
  process.stderr.write(`axe-core left ${unsure} contrasts for a person to look at\n`);
});

describe('the list of screens', () => {
  it('has one for every route of the app', () => {
    const files = readdirSync(path.resolve('app'), { recursive: true, encoding: 'utf8' });
    const routes = files
      .filter((file) => file.endsWith('.tsx') && !file.endsWith('_layout.tsx'))
      .map((file) => file.slice(0, -'.tsx'.length));
    const listed = [...EMPTY_SCREENS, ...SCREENS].map(({ route }) => route);
    expect([...new Set(listed)].sort()).toEqual(routes.sort());
  });
});

describe.each(EMPTY_SCREENS)('$name', checkScreen);

describe('with data', () => {
  beforeAll(async () => {
    Object.assign(demo, await makeDemo(session.page));
  });
  describe.each(SCREENS)('$name', checkScreen);
});

function checkScreen({ reach, leave, route, foldsUp }: DemoScreen): void {
  const showAt = async (size: typeof PHONE) => {
    await session.page.setViewportSize(size);
    if (foldsUp) {
      await leave?.(session.page);
      await reach(session.page, demo);
    }
    await settle(session.page);
  };
  beforeAll(async () => {
    await session.page.emulateMedia({ reducedMotion: 'reduce', colorScheme: 'light' });
    await session.page.setViewportSize(PHONE);
    await reach(session.page, demo);
  });
  afterAll(async () => {
    await session.page.setViewportSize(PHONE);
    await leave?.(session.page);
  });

  for (const [theme, colorScheme] of Object.entries(THEMES)) {
    it.each(Object.entries(SIZES))(
      `breaks no rule of axe-core in ${theme}, %s`,
      async (_, size) => {
        await session.page.emulateMedia({ colorScheme });
        await showAt(size);
        const { violations, unsureContrasts } = await runAxe(session.page);
        unsure += unsureContrasts;
        expect(violations).toEqual([]);
      },
    );
  }

  it.each(Object.entries(SIZES))('has nothing too small to hit, %s', async (_, size) => {
    await showAt(size);
    expect(await findSmallTargets(session.page)).toEqual([]);
  });

  it('holds in a window of 320 px, at any size of text up to 200 %', async () => {
    for (const percent of ['100%', '200%']) {
      await showAt(NARROW);
      await setTextSize(percent);
      await settle(session.page);
      expect({ percent, over: await findOverflow(session.page) }).toEqual({ percent, over: [] });
    }
    await setTextSize('100%');
  });

  if (route !== 'projects/[id]/[station]') return;
  it('gives half of a phone on its side to the tally, when it counts', async () => {
    await session.page.setViewportSize(SIDEWAYS);
    await settle(session.page);
    const tally = session.page.getByTestId('tally');
    const box = (await tally.count()) > 0 ? await tally.boundingBox() : { width: SIDEWAYS.width };
    expect(box?.width).toBeGreaterThanOrEqual(SIDEWAYS.width / 2);
  });
}

/** As in the browser's own settings; the app looks again when the window changes. */
async function setTextSize(percent: string): Promise<void> {
  await session.page.evaluate((size) => {
    document.documentElement.style.fontSize = size;
    window.dispatchEvent(new Event('resize'));
  }, percent);
}
