import type { Answer, Command } from '../../store/command';
import { SCHEMA_VERSION } from '../../store/migrate';
import { openStore, type Performed, type Store } from '../../store/open-store';
import { applyChanges } from '../../store/project-change';
import { failureOf } from '../failure-of';
import type { SnapshotBox } from '../snapshot-box';
import type { OpenedDatabase, TabChannel, TabEnvironment } from './tab-environment';

/** The tab that owns the database. */
export interface Leader {
  perform(request: string | null, command: Command): Promise<Answer>;
  welcome(begins: boolean): void;
  /** Ends what was asked for before, then closes the database. */
  close(): Promise<void>;
}

const EXAMPLE = new Set<Command['do']>(['openExample', 'removeExample']);

/** Opens the database. @throws what opening, migrating or reading it throws */
export async function openLeader(
  env: TabEnvironment,
  box: SnapshotBox,
  channel: TabChannel,
): Promise<Leader> {
  const opened = await env.openDatabase();
  const store = await openStore(opened.db, env.tools).catch(async (error: unknown) => {
    await opened.db.close().catch(() => undefined);
    throw error;
  });
  const { storage } = opened;
  const status = { phase: 'ready', role: 'leader', storage, failure: null } as const;
  box.show({ status, projects: store.projects() });
  return lead(env, box, channel, opened, store);
}

function lead(
  env: TabEnvironment,
  box: SnapshotBox,
  channel: TabChannel,
  opened: OpenedDatabase,
  store: Store,
): Leader {
  let revision = 0;
  let asked = false;

  const welcome = (begins: boolean) => {
    const { projects, status } = box.get();
    const { storage, persisted } = status;
    const greeting = { build: env.build, schema: SCHEMA_VERSION };
    channel.send({ kind: 'welcome', begins, revision, projects, storage, persisted, ...greeting });
  };
  const show = ({ changes }: Performed) => {
    opened.keep();
    revision += 1;
    channel.send({ kind: 'changed', revision, changes });
    const failure = box.get().status.failure;
    const projects = applyChanges(box.get().projects, changes);
    box.show(failure ? { projects, status: { failure: null } } : { projects });
  };
  const askToKeep = async () => {
    asked = true;
    const persisted = await env.askToKeep();
    box.show({ status: { persisted } });
    channel.send({ kind: 'status', storage: opened.storage, persisted });
  };
  const fail = async (error: unknown): Promise<Answer> => {
    const failure = await failureOf(error, env.isFull);
    box.show({ status: { failure }, projects: store.projects() });
    welcome(false);
    return { ok: false, ...failure };
  };
  return {
    welcome,
    close: () => store.close(),
    async perform(request, command) {
      try {
        const performed = await store.perform(request, command);
        if (performed.changes.length > 0) show(performed);
        if (performed.changes.length > 0 && !asked && !EXAMPLE.has(command.do)) void askToKeep();
        return performed.answer;
      } catch (error) {
        return fail(error);
      }
    },
  };
}
