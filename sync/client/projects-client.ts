import type { PlanStep } from '../../shared/model/plan';
import type { PlanRequest } from '../../shared/model/plan-request';
import type { ExtraLane, Tally, TallyKey } from '../../shared/model/tally';

/** This device's newest act of a step that undo would take back. */
export interface UndoableAct extends TallyKey {
  /** taps (or lost pieces) that the act put on the shown count; negative when a set lowered it */
  delta: number;
  act: 'tap' | 'set';
  /** grows with every act of the project, so the newest of several steps can be told */
  order: number;
}

/** A project as it stands: the frozen plan rows and every count, own pending acts included. */
export interface ProjectView {
  id: string;
  name: string;
  note: string;
  example: boolean;
  createdAtMs: number;
  /** null until the first count */
  workedAtMs: number | null;
  lastStepKey: string | null;
  request: PlanRequest;
  engine: string;
  steps: PlanStep[];
  extraLanes: ExtraLane[];
  tallies: Tally[];
  /** the newest act per step, at most one a step */
  undoable: UndoableAct[];
}

export type StoreFailure =
  | { kind: 'open-elsewhere' } // another tab holds the database and does not answer
  | { kind: 'newer-schema' } // written by a newer build: reload to update
  | { kind: 'storage-full' }
  | { kind: 'failed'; detail: string };

export interface StoreStatus {
  phase: 'starting' | 'ready' | 'failed';
  role: 'starting' | 'leader' | 'follower';
  /** memory: the browser gives no private file system; snapshots go to IndexedDB, and we say so */
  storage: 'private' | 'memory' | null;
  /** what the browser answered to our request to keep the data; null while it was not asked */
  persisted: boolean | null;
  failure: StoreFailure | null;
}

export interface StoreSnapshot {
  status: StoreStatus;
  /** newest work first; replaced, never changed, so that identity tells what moved */
  projects: readonly ProjectView[];
}

export interface NewProject {
  name: string;
  note?: string;
  request: PlanRequest;
}

export type ActResult = { ok: true; project: ProjectView } | ({ ok: false } & StoreFailure);

/** Everything that components may do with what is kept on this device. */
export interface ProjectsClient {
  /** Opens the store, once; repeated after a failure it tries again. */
  start(): Promise<void>;
  snapshot(): StoreSnapshot;
  subscribe(listener: () => void): () => void;
  /** Plans the request and keeps project, steps and lanes; the request must be plannable. */
  create(project: NewProject): Promise<ActResult>;
  rename(id: string, name: string): Promise<ActResult>;
  /** Puts the project into the bin; `restore` brings it back whole. */
  remove(id: string): Promise<ActResult>;
  restore(id: string): Promise<ActResult>;
  /** Resolves when the tap is on disk and shown in every tab. */
  tap(id: string, key: TallyKey, delta: number): Promise<ActResult>;
  /** Sets a count exactly: want ≥ 0. */
  set(id: string, key: TallyKey, want: number): Promise<ActResult>;
  /** Takes back this device's newest act among these steps; nothing to take back is no failure. */
  undo(id: string, steps: readonly string[]): Promise<ActResult>;
  addLane(id: string, lane: ExtraLane): Promise<ActResult>;
  openExample(): Promise<{ ok: true } | ({ ok: false } & StoreFailure)>;
  /** Takes the example's projects away again, for good. */
  removeExample(): Promise<{ ok: true } | ({ ok: false } & StoreFailure)>;
  /** The whole store as one JSON document `{ kind: 'backup', version: 1, … }`. */
  saveCopy(): Promise<string>;
  /** journal mode, locking mode, synchronous level, as SQLite reports them: "wal exclusive 2" */
  durability(): Promise<string>;
}
