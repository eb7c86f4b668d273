import { readStep, shownCount, type StepReading, stepOf } from '@/components/station/step-reading';
import { createTallyQueue } from '@/components/station/tally-queue';
import type { ExtraLane, TallyKind } from '@/shared/model/tally';
import { projects } from '@/sync/client/projects';
import type { ActResult, StoreFailure, UndoableAct } from '@/sync/client/projects-client';

/** An act once it is on disk, with the step as it stood before and as it stands now. */
export interface ActDone {
  act: 'count' | 'set' | 'undo' | 'putBack' | 'lost' | 'unpick';
  before: StepReading;
  after: StepReading;
  /** the lane, or the item of a lost piece, that the act changed */
  lane: string;
  /** what an undo took back; null for every other act, and for a plain −1 */
  undone: UndoableAct | null;
}

export interface ActEvents {
  onDone: (done: ActDone) => void;
  onFailure: (failure: StoreFailure) => void;
}

export interface CountActs {
  /** who is told from now on */
  listen: (events: ActEvents) => void;
  /** taps under way by lane key */
  pending: ReadonlyMap<string, number>;
  tap: (lane: string, taps: number) => void;
  set: (lane: string, taps: number) => void;
  undo: (lane: string | null) => void;
  putBack: (undone: UndoableAct | null, lane: string, shownBefore: number) => void;
  lose: (item: string, pieces: number, recut: readonly ExtraLane[]) => void;
  unpick: (lane: string, taps: number) => void;
}

type Task = (before: StepReading) => Promise<ActResult>;

/** The acts on one step's counts, each on disk before the next begins and before it is told. */
export function createCountActs(id: string, step: string): CountActs {
  const pending = new Map<string, number>();
  let events: ActEvents = { onDone: () => undefined, onFailure: () => undefined };
  const queue = createTallyQueue((reason) =>
    events.onFailure({ kind: 'failed', detail: String(reason) }),
  );
  const key = (lane: string, kind: TallyKind) => ({ step, lane, kind });
  const run = async (act: ActDone['act'], lane: string, task: Task, undone?: UndoableAct) => {
    const before = readStep(id, step);
    if (!before) return;
    const result = await task(before);
    if (!result.ok) return events.onFailure(result);
    const after = stepOf(result.project, step);
    if (after) events.onDone({ act, before, after, lane, undone: undone ?? null });
  };
  const add = (act: ActDone['act'], lane: string, task: Task) =>
    queue.add(() => run(act, lane, task));

  return {
    pending,
    listen: (next) => {
      events = next;
    },
    tap: (lane, taps) => {
      pending.set(lane, (pending.get(lane) ?? 0) + taps);
      queue.add(() =>
        run('count', lane, () => projects.tap(id, key(lane, 'done'), taps)).finally(() => {
          pending.set(lane, (pending.get(lane) ?? 0) - taps);
        }),
      );
    },
    // what stands is done − unpicked, so the count on disk is that much higher
    set: (lane, taps) =>
      add('set', lane, ({ project }) =>
        projects.set(id, key(lane, 'done'), taps + shownCount(project, key(lane, 'unpicked'))),
      ),
    undo: (lane) =>
      queue.add(async () => {
        const act = readStep(id, step)?.project.undoable.find((each) => each.step === step);
        if (act) return run('undo', act.lane, () => projects.undo(id, [step]), act);
        if (lane === null || !mayTakeOne(id, step, lane)) return undefined;
        return run('undo', lane, () => projects.tap(id, key(lane, 'done'), -1));
      }),
    putBack: (undone, lane, shownBefore) =>
      add('putBack', lane, () => {
        if (undone === null) return projects.tap(id, key(lane, 'done'), 1);
        const where = key(undone.lane, undone.kind);
        return undone.act === 'set'
          ? projects.set(id, where, shownBefore)
          : projects.tap(id, where, undone.delta);
      }),
    lose: (item, pieces, recut) =>
      add('lost', item, async () => {
        const lost = await projects.tap(id, key(item, 'lost'), pieces);
        return recut.reduce<Promise<ActResult>>(async (earlier, lane) => {
          const result = await earlier;
          return result.ok ? projects.addLane(id, lane) : result;
        }, Promise.resolve(lost));
      }),
    unpick: (lane, taps) =>
      add('unpick', lane, () => projects.tap(id, key(lane, 'unpicked'), taps)),
  };
}

/** With no act of this device left, − corrects a count that another made. */
function mayTakeOne(id: string, step: string, lane: string): boolean {
  const lanes = readStep(id, step)?.progress.lanes ?? [];
  return lanes.some((each) => each.lane.key === lane && each.done > 0);
}
