import type { Answer, Command } from '../../store/command';
import { SCHEMA_VERSION } from '../../store/migrate';
import { applyChanges } from '../../store/project-change';
import type { StoreFailure } from '../projects-client';
import type { SnapshotBox } from '../snapshot-box';
import type { TabChannel, TabEnvironment } from './tab-environment';
import type { TabMessage } from './tab-message';
import { createWaitingRequests, REQUEST_VALID_MS } from './waiting-requests';

/** A tab that shows what the leader tells, and sends it what is done here. */
export interface Follower {
  ask(request: string, command: Command): Promise<Answer>;
  receive(message: TabMessage): void;
  /** Becoming the leader: does what no leader has answered yet. */
  handOver(perform: (request: string, command: Command) => Promise<Answer>): void;
  failAll(answer: Answer): void;
}

type Welcome = Extract<TabMessage, { kind: 'welcome' }>;
type Changed = Extract<TabMessage, { kind: 'changed' }>;

export function createFollower(
  env: TabEnvironment,
  box: SnapshotBox,
  channel: TabChannel,
): Follower {
  const waiting = createWaitingRequests(env.after);
  let revision = 0;

  const send = (request: string, command: Command) => {
    const untilMs = env.tools.nowMs() + REQUEST_VALID_MS;
    channel.send({ kind: 'request', request, command, untilMs });
  };
  const welcome = (message: Welcome) => {
    const failure = refuse(message.schema);
    if (failure) return box.show({ status: { phase: 'failed', role: 'starting', failure } });
    revision = message.revision;
    const { projects, storage, persisted } = message;
    const status = { phase: 'ready', role: 'follower', storage, persisted, failure: null } as const;
    box.show({ status, projects });
    if (message.begins) waiting.again(send);
  };
  const change = (message: Changed) => {
    if (box.get().status.role !== 'follower') return;
    const next = message.revision === revision + 1;
    revision = message.revision;
    if (next) box.show({ projects: applyChanges(box.get().projects, message.changes) });
    // something was missed: the leader tells everything again
    else channel.send({ kind: 'hello', build: env.build, schema: SCHEMA_VERSION });
  };
  return {
    ask(request, command) {
      const answer = waiting.add(request, command);
      send(request, command);
      return answer;
    },
    receive(message) {
      if (message.kind === 'welcome') welcome(message);
      else if (message.kind === 'changed') change(message);
      else if (message.kind === 'answer') waiting.settle(message.request, message.answer);
      else if (message.kind === 'status') {
        box.show({ status: { storage: message.storage, persisted: message.persisted } });
      }
    },
    handOver(perform) {
      waiting.again((request, command) => {
        void perform(request, command).then((answer) => waiting.settle(request, answer));
      });
    },
    failAll: waiting.failAll,
  };
}

/** An older build has no business with a newer schema; a newer one waits until the older has gone. */
function refuse(leaderSchema: number): StoreFailure | null {
  if (leaderSchema > SCHEMA_VERSION) return { kind: 'newer-schema' };
  return leaderSchema < SCHEMA_VERSION ? { kind: 'open-elsewhere' } : null;
}
