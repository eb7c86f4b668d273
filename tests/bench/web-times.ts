import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { BrowserContext, Page } from 'playwright-core';

import { killBrowser, openBrowser } from '../support/chromium';
import { openAt, untilReadyForOffline } from '../support/e2e-page';
import { BASE_URL, startServer, stopServer } from '../support/server-process';
import { makeBenchProject } from './bench-project';
import { bundleFigures } from './bundle-sizes';
import { report, type Figure } from './report';
import { startFigures, timeStarts } from './start-times';
import { tapFigures, timeTaps } from './tap-times';
import { watchPage } from './watch-page';

const TAPS = Number(process.env.BENCH_TAPS ?? 1000);
const TAPS_BEFORE = Number(process.env.BENCH_TAPS_BEFORE ?? 10_000);
const STARTS = Number(process.env.BENCH_STARTS ?? 15);
const SAFEST = 'wal exclusive 2'; // 2 is FULL

async function measure(browser: BrowserContext): Promise<boolean> {
  await browser.addInitScript(watchPage);
  const leader = await browser.newPage();
  await openAt(leader, '/projects');
  await leader.getByTestId('plan-a-quilt').waitFor();
  await untilReadyForOffline(leader);
  console.log(`Making a project with ${TAPS_BEFORE} taps …`);
  const project = await makeBenchProject(leader, TAPS_BEFORE, 2 * TAPS);
  const durability = await readDurability(leader);
  const step = `${project.address}/iron?step=tip-turn`;

  console.log(`Tapping ${TAPS} times in the leading tab …`);
  await openStep(leader, step);
  const first = await timeTaps(leader, TAPS);
  console.log(`Tapping ${TAPS} times in a second tab …`);
  const second = await browser.newPage();
  await openStep(second, step);
  if (leader.workers().length === 0 || second.workers().length > 0) {
    throw new Error('the first tab does not lead');
  }
  const follower = await timeTaps(second, TAPS);
  await expectCount(leader, 2 * TAPS);
  await second.close();
  await leader.close();

  const cold = await timeColdStarts();
  await stopServer();
  const warm = await timeStarts(browser, STARTS);
  const figures: Figure[] = [
    { name: 'taps in the project before', value: project.taps, unit: '' },
    ...tapFigures('leading tab', first),
    ...tapFigures('second tab', follower),
    ...startFigures('warm start, server off', warm, true),
    ...startFigures('first start, empty browser', cold, false),
    ...bundleFigures(path.resolve(process.env.WEB_DIST ?? 'dist')),
  ];
  console.log(`\nSQLite says of the database: ${durability}`);
  return report('The app in Chromium', figures) && durability === SAFEST;
}

async function openStep(page: Page, address: string): Promise<void> {
  await openAt(page, address);
  await page.getByTestId('tally').waitFor();
  await page.waitForTimeout(1000); // what loads behind the page would be measured with it
}

/** As the page "Me" tells it, asked of the database itself. */
async function readDurability(page: Page): Promise<string> {
  await openAt(page, '/me');
  return page.getByTestId('fact-durability').innerText();
}

/** Every tap of both tabs is kept: the number is the same after a reload. */
async function expectCount(page: Page, count: number): Promise<void> {
  await page.reload();
  const shown = await page.getByTestId('tally-number').innerText();
  if (Number(shown) !== count) throw new Error(`${count} taps were shown, ${shown} are kept`);
}

async function timeColdStarts(): Promise<number[]> {
  const times: number[] = [];
  for (let start = 0; start < 3; start += 1) {
    await inBrowser(async (browser) => {
      const page = await browser.newPage();
      const began = performance.now();
      await page.goto(`${BASE_URL}/`, { waitUntil: 'commit' });
      await page.getByTestId('open-example').waitFor();
      times.push(performance.now() - began);
    });
  }
  return times;
}

async function inBrowser<Value>(job: (browser: BrowserContext) => Promise<Value>): Promise<Value> {
  const profile = mkdtempSync(path.join(tmpdir(), 'bench-'));
  try {
    const browser = await openBrowser(profile, []);
    const value = await job(browser);
    await browser.close();
    return value;
  } finally {
    killBrowser(profile);
    rmSync(profile, { recursive: true, force: true, maxRetries: 5 });
  }
}

async function main(): Promise<void> {
  await startServer();
  try {
    process.exitCode = (await inBrowser(measure)) ? 0 : 1;
  } finally {
    await stopServer();
  }
}

void main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
