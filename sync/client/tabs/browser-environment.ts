import type { StoreTools } from '../../store/store-tools';
import { openWebDatabase } from '../../store/sqlite/web/open-web-database';
import { newId } from '../new-id';
import type { TabEnvironment } from './tab-environment';
import type { TabMessage } from './tab-message';

const NAME = 'matside-database';
const ROOM_BYTES = 1024 * 1024;

/** The browser, as a tab needs it. */
export function browserEnvironment(
  engine: Pick<StoreTools, 'makePlan' | 'exampleProjects'>,
): TabEnvironment {
  return {
    build: process.env.EXPO_PUBLIC_BUILD ?? 'unnamed',
    tools: {
      nowMs: Date.now,
      random16: async () => crypto.getRandomValues(new Uint8Array(16)),
      newIds: async (count) => Array.from({ length: count }, () => newId(Date.now())),
      ...engine,
    },
    newId: () => newId(Date.now()),
    openDatabase: openWebDatabase,
    openChannel,
    holdLock: async (hold) => {
      await navigator.locks.request(NAME, hold);
    },
    askToKeep: async () => (await navigator.storage?.persist?.()) ?? false,
    isFull,
    after(delayMs, job) {
      const timer = setTimeout(job, delayMs);
      return () => clearTimeout(timer);
    },
  };
}

function openChannel(onMessage: (message: TabMessage) => void) {
  const channel = new BroadcastChannel(NAME);
  channel.onmessage = ({ data }: MessageEvent<TabMessage>) => onMessage(data);
  return {
    send: (message: TabMessage) => channel.postMessage(message),
    close: () => channel.close(),
  };
}

async function isFull(): Promise<boolean> {
  const { quota, usage } = (await navigator.storage?.estimate?.()) ?? {};
  return quota !== undefined && usage !== undefined && quota - usage < ROOM_BYTES;
}
