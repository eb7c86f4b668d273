import type { ExtraLane } from '../../shared/model/tally';
import { addExtraLane, deleteProject, restoreProject, writeField } from './acts/change-project';
import { createProject } from './acts/create-project';
import { openExample, removeExample } from './acts/example';
import { setTally } from './acts/set-tally';
import { tapTally } from './acts/tap-tally';
import { undoNewest } from './acts/undo-newest';
import { DONE, failed, type Answer, type Command } from './command';
import type { ProjectRecord } from './project-record';
import type { SqlDatabase } from './sql-database';
import { storableText } from './sql-text';
import type { StoreTools } from './store-tools';
import type { Work } from './work';

export type WriteCommand = Exclude<Command, { do: 'saveCopy' | 'durability' }>;
type ProjectCommand = Exclude<WriteCommand, { do: 'create' | 'openExample' | 'removeExample' }>;

/** Puts the transaction of a command together. A failure writes nothing. */
export async function performCommand(
  db: SqlDatabase,
  work: Work,
  tools: StoreTools,
  command: WriteCommand,
): Promise<Answer> {
  if (command.do === 'create') return create(work, tools, command);
  if (command.do === 'openExample') return openExample(work, tools);
  if (command.do === 'removeExample') return removeExample(work);
  const record = work.records.get(command.id);
  if (!record) return failed('no such project');
  return change(db, work, record, command);
}

function create(work: Work, tools: StoreTools, command: Command & { do: 'create' }): Answer {
  const { id, request } = command;
  const [name, note] = [storableText(command.name), storableText(command.note)];
  if (work.records.has(id)) return DONE;
  const plan = tools.makePlan(request);
  if (!plan.ok) return failed(plan.errors.map(({ code }) => code).join(' '));
  createProject(work, { id, name, note, example: false, plan: plan.value });
  return DONE;
}

async function change(
  db: SqlDatabase,
  work: Work,
  record: ProjectRecord,
  command: ProjectCommand,
): Promise<Answer> {
  switch (command.do) {
    case 'tap':
      if (!Number.isSafeInteger(command.delta)) return failed('not a whole number');
      tapTally(work, record, command.key, command.delta);
      return DONE;
    case 'set':
      if (!Number.isSafeInteger(command.want) || command.want < 0) return failed('not a count');
      setTally(work, record, command.key, command.want);
      return DONE;
    case 'undo':
      await undoNewest(db, work, record, command.steps);
      return DONE;
    case 'rename':
      rename(work, record, storableText(command.name));
      return DONE;
    case 'remove':
      if (!record.deleted) deleteProject(work, record);
      return DONE;
    case 'restore':
      if (record.deleted) restoreProject(work, record);
      return DONE;
    case 'addLane':
      if (!hasLane(record, command.lane)) addExtraLane(work, record, command.lane);
      return DONE;
  }
}

function rename(work: Work, record: ProjectRecord, name: string): void {
  if (name !== record.view.name) writeField(work, record, 'name', name);
}

function hasLane({ view }: ProjectRecord, { step, key }: ExtraLane): boolean {
  const planned = view.steps.find((one) => one.key === step)?.lanes ?? [];
  const extra = view.extraLanes.filter((one) => one.step === step);
  return [...planned, ...extra].some((lane) => lane.key === key);
}
