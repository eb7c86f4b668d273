import type { PlanRequest } from '../../shared/model/plan-request';
import type { ExtraLane, TallyKey } from '../../shared/model/tally';
import type { StoreFailure } from '../client/projects-client';

/** All that may be asked of a store; plain data, so that any tab may send it to the leader. */
export type Command =
  | { do: 'create'; id: string; name: string; note: string; request: PlanRequest }
  | { do: 'rename'; id: string; name: string }
  | { do: 'remove'; id: string }
  | { do: 'restore'; id: string }
  | { do: 'tap'; id: string; key: TallyKey; delta: number }
  | { do: 'set'; id: string; key: TallyKey; want: number }
  | { do: 'undo'; id: string; steps: readonly string[] }
  | { do: 'addLane'; id: string; lane: ExtraLane }
  | { do: 'openExample' }
  | { do: 'removeExample' }
  | { do: 'saveCopy' }
  | { do: 'durability' };

/** `text` answers what was asked for (a copy, the durability); acts answer null. */
export type Answer = { ok: true; text: string | null } | ({ ok: false } & StoreFailure);

export const DONE: Answer = { ok: true, text: null };
export const failed = (detail: string): Answer => ({ ok: false, kind: 'failed', detail });
