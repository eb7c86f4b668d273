import type { Answer, Command } from '../store/command';
import { openStore, type Store } from '../store/open-store';
import { applyChanges } from '../store/project-change';
import type { SqlDatabase } from '../store/sql-database';
import type { StoreTools } from '../store/store-tools';
import { failureOf } from './failure-of';
import type { ProjectsClient } from './projects-client';
import { createSnapshotBox } from './snapshot-box';
import { toProjectsClient } from './to-projects-client';

export interface LocalEnvironment {
  tools: StoreTools;
  open(): Promise<SqlDatabase>;
}

const roomLeft = async () => false; // native I/O errors name a full disk themselves

/** One process, one database: the client of a phone's own app. */
export function createLocalClient(env: LocalEnvironment): ProjectsClient {
  const box = createSnapshotBox();
  let opening: Promise<Store | null> | null = null;

  const open = async (): Promise<Store | null> => {
    try {
      const db = await env.open();
      const store = await openStore(db, env.tools);
      const status = { phase: 'ready', role: 'leader', storage: 'private', failure: null } as const;
      box.show({ status, projects: store.projects() });
      return store;
    } catch (error) {
      opening = null;
      box.show({ status: { phase: 'failed', failure: await failureOf(error, roomLeft) } });
      return null;
    }
  };
  const opened = () => (opening ??= open());
  const call = async (command: Command): Promise<Answer> => {
    const store = await opened();
    const { failure } = box.get().status;
    if (!store) return { ok: false, ...(failure ?? { kind: 'failed', detail: 'not open' }) };
    try {
      const { answer, changes } = await store.perform(null, command);
      box.show({ projects: applyChanges(box.get().projects, changes), status: { failure: null } });
      return answer;
    } catch (error) {
      const failed = await failureOf(error, roomLeft);
      box.show({ projects: store.projects(), status: { failure: failed } });
      return { ok: false, ...failed };
    }
  };
  const start = async () => void (await opened());
  return toProjectsClient(box, { start, call, newIds: env.tools.newIds });
}
