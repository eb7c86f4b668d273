import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { BrowserContext, Page } from 'playwright-core';

import { killBrowser, openBrowser, PHONE } from './chromium';
import { startServer, stopServer } from './server-process';

interface Session {
  profile: string;
  /** errors on the console, of the page and of the content policy, in all tabs */
  complaints: string[];
  readonly browser: BrowserContext;
  /** the first tab */
  readonly page: Page;
  /** opens the browser again on what the last one left on disk */
  reopen: () => Promise<void>;
}

/** A browser with an empty profile beside a running server, for the tests of the file calling it. */
export function openSession({ viewport = PHONE, env = {} } = {}): Session {
  const profile = mkdtempSync(path.join(tmpdir(), 'browser-'));
  const complaints: string[] = [];
  let browser: BrowserContext | null = null;
  const opened = (): BrowserContext => {
    if (!browser) throw new Error('the browser is not open yet');
    return browser;
  };
  const open = async () => {
    browser = await openBrowser(profile, complaints, 'allow', viewport);
    if (browser.pages().length === 0) await browser.newPage();
  };
  beforeAll(async () => {
    await startServer(env);
    await open();
  });
  afterAll(async () => {
    await browser?.close().catch(() => undefined); // one that was killed is closed already
    killBrowser(profile);
    await stopServer();
    rmSync(profile, { recursive: true, force: true, maxRetries: 5 });
  });
  return {
    profile,
    complaints,
    get browser() {
      return opened();
    },
    get page() {
      const [first] = opened().pages();
      if (!first) throw new Error('no tab is open');
      return first;
    },
    reopen: open,
  };
}
