// One tab (the leader, holder of a Web Lock) opens the database; the others send it their commands.
// A command carries a request id that is written with it, so sending it again to a new leader does
// it once.
import type { Answer, Command } from '../../store/command';
import { SCHEMA_VERSION } from '../../store/migrate';
import { failureOf } from '../failure-of';
import type { ProjectsClient, StoreFailure } from '../projects-client';
import { createSnapshotBox } from '../snapshot-box';
import { toProjectsClient } from '../to-projects-client';
import { createFollower, type Follower } from './follower';
import { openLeader, type Leader } from './leader';
import type { TabChannel, TabEnvironment } from './tab-environment';
import type { TabMessage } from './tab-message';

/** How long a tab looks for a leader before it says that another tab is in the way. */
const START_WITHIN_MS = 6000;
/** How long a tab that has the lock waits for its own database: files of a dying tab come free. */
const OPEN_WITHIN_MS = 40_000;

/** The web's client: the same in every tab, whichever leads. */
export function createTabClient(env: TabEnvironment): ProjectsClient {
  const tab = new Tab(env);
  return toProjectsClient(tab.box, {
    start: () => tab.start(),
    call: (command) => tab.call(command),
    newIds: env.tools.newIds,
  });
}

class Tab {
  readonly box = createSnapshotBox();
  private readonly channel: TabChannel;
  private readonly follower: Follower;
  private leader: Leader | null = null;
  private starting: Promise<void> | null = null;
  private queued = false;
  private opening = false;

  constructor(private readonly env: TabEnvironment) {
    this.channel = env.openChannel((message) => this.receive(message));
    this.follower = createFollower(env, this.box, this.channel);
  }

  /** Resolves when the store is open, here or in another tab, or the status tells why not. */
  start(): Promise<void> {
    if (this.box.get().status.phase === 'failed') this.starting = null;
    this.starting ??= this.begin();
    return this.starting;
  }

  async call(command: Command): Promise<Answer> {
    await (this.starting ?? this.start());
    const { phase, failure } = this.box.get().status;
    if (phase === 'failed' && failure) return { ok: false, ...failure };
    // what the leader does for itself has no answer that could be lost
    return this.leader?.perform(null, command) ?? this.follower.ask(this.env.newId(), command);
  }

  private begin(): Promise<void> {
    this.box.show({ status: { phase: 'starting', failure: null } });
    return new Promise((resolve) => {
      const stop = this.box.subscribe(() => {
        if (this.box.get().status.phase === 'starting') return;
        stop();
        callOff();
        resolve();
      });
      const giveUp = () => this.fail({ kind: 'open-elsewhere' });
      let callOff = this.env.after(START_WITHIN_MS, () => {
        // no other tab is in the way while this one opens the database itself
        if (this.opening) callOff = this.env.after(OPEN_WITHIN_MS, giveUp);
        else giveUp();
      });
      this.queueForLock();
      this.channel.send({ kind: 'hello', build: this.env.build, schema: SCHEMA_VERSION });
    });
  }

  /** One place in the queue a tab: it is kept, so that the next leader is there when one goes. */
  private queueForLock(): void {
    if (this.queued) return;
    this.queued = true;
    const hold = () => this.lead();
    this.env.holdLock(hold).catch(() => (this.queued = false));
  }

  /** Leads until this tab goes; gives the lock back at once if the database does not open. */
  private async lead(): Promise<void> {
    this.opening = true;
    try {
      this.leader = await openLeader(this.env, this.box, this.channel);
    } catch (error) {
      const failure = await failureOf(error, this.env.isFull);
      this.queued = false; // the lock is free again: `start` queues anew
      this.fail(failure);
      return;
    } finally {
      this.opening = false;
    }
    this.leader.welcome(true);
    const { leader } = this;
    this.follower.handOver((request, command) => leader.perform(request, command));
    await new Promise(() => undefined);
  }

  private fail(failure: StoreFailure): void {
    this.box.show({ status: { phase: 'failed', role: 'starting', failure } });
    this.follower.failAll({ ok: false, ...failure });
  }

  private receive(message: TabMessage): void {
    if (this.leader) void this.answer(this.leader, message);
    else this.follower.receive(message);
  }

  private async answer(leader: Leader, message: TabMessage): Promise<void> {
    if (message.kind === 'hello') leader.welcome(false);
    if (message.kind !== 'request' || this.env.tools.nowMs() > message.untilMs) return;
    const { request, command } = message;
    this.channel.send({ kind: 'answer', request, answer: await leader.perform(request, command) });
  }
}
