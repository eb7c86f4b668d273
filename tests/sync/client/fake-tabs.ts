import { setTimeout as sleep } from 'node:timers/promises';

import type { SqlDatabase } from '../../../sync/store/sql-database';
import type { TabEnvironment } from '../../../sync/client/tabs/tab-environment';
import type { TabMessage } from '../../../sync/client/tabs/tab-message';
import { openNodeDatabase } from '../../support/open-node-database';
import { handTools } from '../store/hand-plan';

/** A browser of our own: one lock, one channel and one file for several tabs of this process. */
export interface FakeBrowser {
  openTab(options?: { build?: string }): FakeTab;
  /** every message sent, in order */
  sent: TabMessage[];
  /** Makes the next transactions fail as a full disk does. */
  fill(full: boolean): void;
  /** Makes the next opening of the database fail. */
  failOpening(): void;
  /** Time goes only when a test lets it, so that a slow machine changes nothing. */
  pass(ms: number): void;
}

export interface FakeTab {
  env: TabEnvironment;
  /** The tab goes at once: nothing it was doing goes on, and its lock is free. */
  kill(): void;
  /** Messages to this tab wait until it is thawed. */
  freeze(frozen: boolean): void;
}

interface Waiter {
  tab: object;
  begin(): void;
}

export function openFakeBrowser(file: string): FakeBrowser {
  const tabs = new Map<object, (message: TabMessage) => void>();
  const waiters: Waiter[] = [];
  const sent: TabMessage[] = [];
  let holder: object | null = null;
  let full = false;
  let failing = false;
  let serial = 0;
  let nowMs = 1_000_000;
  const timers = new Set<{ dueMs: number; job: () => void }>();
  const pass = (ms: number) => {
    nowMs += ms;
    for (const timer of [...timers]) {
      if (timer.dueMs > nowMs || !timers.delete(timer)) continue;
      timer.job();
    }
  };

  const release = (tab: object) => {
    if (holder !== tab) return;
    holder = null;
    waiters.shift()?.begin();
  };
  const holdLock = (tab: object, hold: () => Promise<void>) =>
    new Promise<void>((resolve, reject) => {
      const begin = () => {
        holder = tab;
        hold()
          .then(resolve, reject)
          .finally(() => release(tab));
      };
      if (holder === null) begin();
      else waiters.push({ tab, begin });
    });

  const openTab = ({ build = 'one' } = {}): FakeTab => {
    const tab = {};
    let alive = true;
    let db: SqlDatabase | null = null;
    let frozen: TabMessage[] | null = null;
    const openDatabase = async () => {
      if (failing) {
        failing = false;
        throw new Error('unable to open database file');
      }
      const opened = openNodeDatabase(file);
      db = opened;
      const exec = async (sql: string) => {
        await sleep(0);
        if (!alive) throw new Error('the tab is gone');
        if (full && sql.includes('COMMIT')) throw new Error('database or disk is full');
        return opened.exec(sql);
      };
      return { db: { ...opened, exec }, storage: 'private' as const, keep() {} };
    };
    const openChannel = (onMessage: (message: TabMessage) => void) => {
      tabs.set(tab, (message) => (frozen ? frozen.push(message) : onMessage(message)));
      return {
        send: (message: TabMessage) => alive && post(message),
        close: () => tabs.delete(tab),
      };
    };
    const post = (message: TabMessage) => {
      sent.push(message);
      for (const [other, receive] of tabs) {
        const copy = structuredClone(message);
        if (other !== tab) setImmediate(() => tabs.has(other) && receive(copy));
      }
    };
    const env: TabEnvironment = {
      build,
      tools: {
        ...handTools(),
        nowMs: () => nowMs,
        newIds: async (count) => Array.from({ length: count }, () => crypto.randomUUID()),
      },
      newId: () => `request ${(serial += 1)}`,
      openDatabase,
      openChannel,
      holdLock: (hold) => holdLock(tab, hold),
      askToKeep: async () => true,
      isFull: async () => false,
      after(delayMs, job) {
        const timer = { dueMs: nowMs + delayMs, job };
        timers.add(timer);
        return () => void timers.delete(timer);
      },
    };
    return {
      env,
      kill() {
        if (!alive) return;
        alive = false;
        tabs.delete(tab);
        void db?.close().catch(() => undefined);
        const place = waiters.findIndex((waiter) => waiter.tab === tab);
        if (place >= 0) waiters.splice(place, 1);
        release(tab);
      },
      freeze(on) {
        const held = frozen ?? [];
        frozen = on ? [] : null;
        if (!on) held.forEach((message) => tabs.get(tab)?.(message));
      },
    };
  };
  return {
    openTab,
    sent,
    pass,
    fill: (on) => (full = on),
    failOpening: () => (failing = true),
  };
}
