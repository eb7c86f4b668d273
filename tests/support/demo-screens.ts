import type { Page } from 'playwright-core';

import { STEP_ROLES, type Station, type StepRole } from '../../shared/model/codes';
import { ROLE_FACTS } from '../../shared/steps/role-facts';
import type { Demo } from './demo-projects';
import { openAt, press, retype } from './e2e-page';

/** A screen as a maker meets it, and the way there. */
export interface DemoScreen {
  name: string;
  /** its file in app/, without the ending */
  route: string;
  reach: (page: Page, demo: Demo) => Promise<void>;
  /** puts back what `reach` changed and another screen would find */
  leave?: (page: Page) => Promise<void>;
  /** what was opened is closed when the page changes between its narrow and its wide layout */
  foldsUp?: true;
}

const VISIT_KEY = 'matside.cuttingVisit';
const STATION = 'projects/[id]/[station]';

/** Before anything is kept on the device. */
export const EMPTY_SCREENS: readonly DemoScreen[] = [
  { name: 'ready-empty', route: 'index', reach: (page) => seen(page, '/', 'open-example') },
  {
    name: 'projects-empty',
    route: 'projects/index',
    reach: (page) => seen(page, '/projects', 'open-example'),
  },
];

const PLACES: readonly DemoScreen[] = [
  { name: 'ready', route: 'index', reach: (page) => seen(page, '/', 'carry-on-go') },
  {
    name: 'projects',
    route: 'projects/index',
    reach: (page) => seen(page, '/projects', 'example-row'),
  },
  { name: 'me', route: 'me/index', reach: (page) => seen(page, '/me', 'fact-durability') },
  { name: 'safety', route: 'me/safety', reach: (page) => openAt(page, '/me/safety') },
  { name: 'first-aid', route: 'first-aid', reach: (page) => openAt(page, '/first-aid') },
  { name: 'not-found', route: '+not-found', reach: (page) => openAt(page, '/no/such/page') },
];

const SETUP: readonly DemoScreen[] = [
  { name: 'setup', route: 'projects/new', reach: (page) => seen(page, '/projects/new', 'totals') },
  {
    name: 'setup-refused',
    route: 'projects/new',
    reach: async (page) => {
      await seen(page, '/projects/new', 'totals');
      await retype(page, 'block', 'wide');
      await page.keyboard.press('Tab');
      await press(page, 'make-plan'); // tells every error, and goes to the first
    },
    leave: startAfresh,
  },
  {
    name: 'setup-warnings',
    route: 'projects/new',
    foldsUp: true,
    reach: async (page) => {
      await seen(page, '/projects/new', 'totals');
      await retype(page, 'blocks', '5');
      await retype(page, 'wedges', '18');
      await retype(page, 'layers', '9');
      await page.keyboard.press('Tab');
      await press(page, 'more');
    },
    leave: startAfresh,
  },
  {
    name: 'fabric-sheet',
    route: 'projects/new',
    foldsUp: true,
    reach: async (page) => {
      await seen(page, '/projects/new', 'totals');
      await press(page, 'fabric:1');
      await page.getByTestId('fabric-sheet').waitFor();
    },
  },
  {
    name: 'start-afresh',
    route: 'projects/new',
    foldsUp: true,
    reach: async (page) => {
      await seen(page, '/projects/new', 'totals');
      await press(page, 'start-afresh');
      await page.getByTestId('confirm-afresh').waitFor();
    },
  },
];

const PROJECT: readonly DemoScreen[] = [
  {
    name: 'project',
    route: 'projects/[id]/index',
    reach: (page, { circle }) => seen(page, circle, 'carry-on-go'),
  },
  {
    name: 'project-rename',
    route: 'projects/[id]/index',
    reach: async (page, { circle }) => {
      await seen(page, circle, 'carry-on-go');
      await press(page, 'rename');
      await retype(page, 'project-name', ' ');
    },
  },
  {
    name: 'project-delete',
    route: 'projects/[id]/index',
    reach: async (page, { circle }) => {
      await seen(page, circle, 'carry-on-go');
      await press(page, 'delete-project');
      await page.getByTestId('confirm-delete').waitFor();
    },
  },
  {
    name: 'plan',
    route: 'projects/[id]/plan',
    reach: (page, { circle }) => seen(page, `${circle}/plan`, 'copy-project'),
  },
];

const CHECK: readonly DemoScreen[] = [
  { name: 'check', route: STATION, reach: openCheck },
  {
    name: 'check-more',
    route: STATION,
    reach: async (page, demo) => {
      await openCheck(page, demo);
      await press(page, 'check-blade');
      await press(page, 'check-more');
    },
  },
];

const STEPS: readonly DemoScreen[] = STEP_ROLES.map((role) => ({
  name: `step-${role}`,
  route: STATION,
  reach: (page, { circle, hole }) => openStep(page, role === 'stay-stitch' ? hole : circle, role),
}));

const OVER_A_STEP: readonly DemoScreen[] = [
  {
    name: 'by-hand',
    route: STATION,
    reach: (page, { hole }) => openStep(page, hole, 'applique', 'chair'),
  },
  overStep('steps-sheet', 'cut', (page) => press(page, 'steps')),
  overStep('about-sheet', 'cut', (page) => press(page, 'about')),
  overStep('keypad', 'cut', (page) => press(page, 'keypad')),
  overStep('miscut', 'cut', async (page) => {
    await press(page, 'loss');
    await page.getByTestId('loss-dialog').getByRole('radio').first().click();
  }),
  overStep('guard', 'strip', (page) => press(page, 'tally')),
  overStep('not-yet', 'half', (page) => press(page, 'tally')),
  overStep('locked-toast', 'pair', async (page) => {
    await press(page, 'lock');
    await press(page, 'lock');
    await page.getByTestId('toast').waitFor();
  }),
  // what changes counts comes last
  overStep('unpick', 'tip-sew', async (page) => {
    await press(page, 'tally');
    await press(page, 'loss');
  }),
  overStep('recut-answer', 'cut', async (page) => {
    await press(page, 'loss');
    await page.getByTestId('loss-dialog').getByRole('radio').first().click();
    await press(page, 'loss-yes');
    await page.getByTestId('recut-answer').waitFor();
  }),
  overStep('recut-lane', 'cut'),
];

/** Every screen with data in it, in an order in which each can be reached. */
export const SCREENS: readonly DemoScreen[] = [
  ...PLACES,
  ...SETUP,
  ...PROJECT,
  ...CHECK,
  ...STEPS,
  ...OVER_A_STEP,
];

function overStep(
  name: string,
  role: StepRole,
  act: (page: Page) => Promise<void> = async () => undefined,
): DemoScreen {
  return {
    name,
    route: STATION,
    reach: async (page, demo) => {
      await openStep(page, demo.circle, role);
      await act(page);
    },
  };
}

async function seen(page: Page, address: string, id: string): Promise<void> {
  await openAt(page, address);
  await page.getByTestId(id).first().waitFor();
}

async function openStep(
  page: Page,
  project: string,
  role: StepRole,
  station: Station = ROLE_FACTS[role].station,
): Promise<void> {
  await openAt(page, `${project}/${station}?step=${role}`);
  const skip = page.getByTestId('check-skip');
  await page.getByTestId('tally').or(skip).first().waitFor();
  if (await skip.isVisible()) await skip.click();
  await page.getByTestId('tally').waitFor();
  if (!page.url().endsWith(`/${station}?step=${role}`))
    throw new Error(`no ${role}: ${page.url()}`);
}

/** A cutting visit that was begun goes on for half an hour: forget it. */
async function openCheck(page: Page, { circle }: Demo): Promise<void> {
  await page.evaluate((key) => localStorage.removeItem(key), VISIT_KEY);
  await seen(page, `${circle}/table?step=cut`, 'safety-check');
}

async function startAfresh(page: Page): Promise<void> {
  await press(page, 'start-afresh');
  await press(page, 'confirm-afresh');
}
