import type { Answer, Command } from '../../store/command';
import type { ProjectChange } from '../../store/project-change';
import type { ProjectView, StoreStatus } from '../projects-client';

/** What a tab says about itself: its build, and the schema that it writes. */
export interface TabGreeting {
  build: string;
  schema: number;
}

export type LeaderStatus = Pick<StoreStatus, 'storage' | 'persisted'>;

/** All that tabs say to each other over one channel. */
export type TabMessage =
  | ({ kind: 'hello' } & TabGreeting)
  | ({
      /** from the leader: to one that said hello, and to all when it begins to lead */
      kind: 'welcome';
      begins: boolean;
      revision: number;
      projects: readonly ProjectView[];
    } & TabGreeting &
      LeaderStatus)
  | { kind: 'request'; request: string; command: Command; untilMs: number }
  | { kind: 'answer'; request: string; answer: Answer }
  | { kind: 'changed'; revision: number; changes: readonly ProjectChange[] }
  | ({ kind: 'status' } & LeaderStatus);
