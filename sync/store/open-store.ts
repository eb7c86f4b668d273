import type { ProjectView } from '../client/projects-client';
import type { Answer, Command } from './command';
import { migrate } from './migrate';
import { mintSession } from './mint-session';
import { performCommand, type WriteCommand } from './perform-command';
import type { ProjectChange } from './project-change';
import { keepAnswer, readAnswer } from './read/read-answer';
import { readDurability } from './read/read-durability';
import { loadState, viewsOf } from './read/load-state';
import { saveCopy } from './read/save-copy';
import type { SqlDatabase } from './sql-database';
import type { StoreTools } from './store-tools';
import { beginWork, type StoreState, type Work } from './work';
import { createQueue, writeAll } from './write-queue';

export interface Performed {
  answer: Answer;
  /** what the act changed, once it is on disk */
  changes: readonly ProjectChange[];
}

/** One opened database: the only writer of its file. */
export interface Store {
  projects(): readonly ProjectView[];
  /**
   * Does a command in its turn, in one transaction. A request that was done before, by this store
   * or by an earlier opening of its file, is not done again but answered the same.
   *
   * @param request its id, kept with it; null for a command that nobody can send again
   * @throws what SQLite throws when the transaction fails; then nothing was written
   */
  perform(request: string | null, command: Command): Promise<Performed>;
  /** Ends after what was asked for before. */
  close(): Promise<void>;
}

interface Opened {
  db: SqlDatabase;
  tools: StoreTools;
  state: StoreState;
  /** a commit failed: the memory is to be read again before the next write */
  stale: boolean;
}

/**
 * Migrates and reads the database.
 *
 * @throws NewerSchemaError when a newer build wrote it
 */
export async function openStore(db: SqlDatabase, tools: StoreTools): Promise<Store> {
  await migrate(db);
  const opened: Opened = { db, tools, state: await loadState(db), stale: false };
  const inTurn = createQueue();
  return {
    projects: () => viewsOf(opened.state.records.values()),
    perform: (request, command) => inTurn(() => perform(opened, request, command)),
    close: () => inTurn(() => db.close()),
  };
}

async function perform(
  opened: Opened,
  request: string | null,
  command: Command,
): Promise<Performed> {
  if (command.do === 'durability') return answerWith(await readDurability(opened.db));
  if (command.do === 'saveCopy') return answerWith(await saveCopy(opened.db, opened.tools.nowMs()));
  if (opened.stale) await refresh(opened);
  return write(opened, request, command);
}

const answerWith = (text: string): Performed => ({ answer: { ok: true, text }, changes: [] });

async function write(
  opened: Opened,
  request: string | null,
  command: WriteCommand,
): Promise<Performed> {
  const { db, tools } = opened;
  const session = opened.state.session ?? mintSession(await tools.random16());
  const work = beginWork(opened.state, session, tools.nowMs());
  const begun = work.statements.length;
  const answer = await performCommand(db, work, tools, command);
  if (!answer.ok || work.statements.length === begun) return { answer, changes: [] };
  const kept = request === null ? [] : keepAnswer(request, answer, work.nowMs);
  try {
    await writeAll(db, [...kept, ...work.statements]);
  } catch (error) {
    if (await hasLanded(opened, work)) return { answer, changes: work.changes };
    const known = request === null || opened.stale ? null : await readAnswer(db, request);
    if (known) return { answer: known, changes: [] };
    throw error;
  }
  const { records, seqs, lastOrd, lastTallyNo, lastTimeMs } = work;
  opened.state = { records, session, seqs, lastOrd, lastTallyNo, lastTimeMs };
  return { answer, changes: work.changes };
}

/**
 * A failed commit may have reached the disk all the same: only reading tells. The memory is read
 * again with it, and a new session makes sure that no identity ever names two acts.
 */
async function hasLanded(opened: Opened, work: Work): Promise<boolean> {
  const before = opened.state.lastOrd;
  opened.stale = true;
  await refresh(opened).catch(() => undefined);
  return !opened.stale && work.lastOrd > before && opened.state.lastOrd === work.lastOrd;
}

async function refresh(opened: Opened): Promise<void> {
  opened.state = await loadState(opened.db);
  opened.stale = false;
}
