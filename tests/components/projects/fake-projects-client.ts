import type { PlanRequest, RequestFabric } from '@/shared/model/plan-request';
import type { ExtraLane, TallyKey } from '@/shared/model/tally';
import { defaultRequest, type RingChoices } from '@/shared/plan/default-request';
import { exampleProjects } from '@/shared/plan/example-projects';
import { makePlan } from '@/shared/plan/make-plan';
import type {
  ActResult,
  ProjectsClient,
  ProjectView,
  StoreFailure,
  StoreSnapshot,
} from '@/sync/client/projects-client';

const READY: StoreSnapshot['status'] = {
  phase: 'ready',
  role: 'leader',
  storage: 'private',
  persisted: true,
  failure: null,
};

/** The contract of the store in memory, with a hand on its state for the tests. */
export class FakeProjectsClient implements ProjectsClient {
  private current: StoreSnapshot = { status: READY, projects: [] };
  private readonly listeners = new Set<() => void>();
  private bin: ProjectView[] = [];
  private made = 0;
  refuseWith: StoreFailure | null = null;

  reset(): void {
    this.current = { status: READY, projects: [] };
    this.bin = [];
    this.made = 0;
    this.refuseWith = null;
  }

  private show(snapshot: Partial<StoreSnapshot>): void {
    this.current = { ...this.current, ...snapshot };
    this.listeners.forEach((listener) => listener());
  }

  startUp(): void {
    const status = { ...READY, phase: 'starting' as const, role: 'starting' as const };
    this.show({ status });
  }

  fail(failure: StoreFailure): void {
    this.show({ status: { ...READY, phase: 'failed', failure } });
  }

  start = async () => undefined;
  snapshot = () => this.current;
  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  private find(id: string): ProjectView {
    const found = this.current.projects.find((project) => project.id === id);
    if (!found) throw new Error(`no project ${id}`);
    return found;
  }

  /** Replaces a project and puts it first, as the newest work is. */
  private put(project: ProjectView): ActResult {
    if (this.refuseWith) return { ok: false, ...this.refuseWith };
    const rest = this.current.projects.filter(({ id }) => id !== project.id);
    this.show({ projects: [project, ...rest] });
    return { ok: true, project };
  }

  add(name: string, request: PlanRequest, part: Partial<ProjectView> = {}): ProjectView {
    const plan = makePlan(request);
    if (!plan.ok) throw new Error(`${name} cannot be planned`);
    this.made += 1;
    const project: ProjectView = {
      id: `p${this.made}`,
      name,
      note: '',
      example: false,
      createdAtMs: this.made,
      workedAtMs: null,
      lastStepKey: null,
      request,
      engine: plan.value.engine,
      steps: plan.value.steps,
      extraLanes: [],
      tallies: [],
      undoable: [],
      ...part,
    };
    this.put(project);
    return project;
  }

  create: ProjectsClient['create'] = async ({ name, note = '', request }) =>
    this.refuseWith
      ? { ok: false, ...this.refuseWith }
      : { ok: true, project: this.add(name, request, { note }) };
  rename = async (id: string, name: string) => this.put({ ...this.find(id), name });
  remove = async (id: string): Promise<ActResult> => {
    const project = this.find(id);
    this.bin.push(project);
    this.show({ projects: this.current.projects.filter((other) => other.id !== id) });
    return { ok: true, project };
  };
  restore = async (id: string): Promise<ActResult> => {
    const project = this.bin.find((binned) => binned.id === id);
    return project ? this.put(project) : { ok: false, kind: 'failed', detail: 'not in the bin' };
  };
  tap = async (id: string, key: TallyKey, delta: number) => {
    const before = this.find(id).tallies.find((tally) => same(tally, key))?.shown ?? 0;
    return this.set(id, key, before + delta);
  };
  set = async (id: string, key: TallyKey, want: number): Promise<ActResult> => {
    const project = this.find(id);
    const others = project.tallies.filter((tally) => !same(tally, key));
    const tallies = [...others, { ...key, shown: Math.max(0, want) }];
    return this.put({ ...project, tallies, lastStepKey: key.step, workedAtMs: 1 });
  };
  undo = async (id: string): Promise<ActResult> => ({ ok: true, project: this.find(id) });
  addLane = async (id: string, lane: ExtraLane) => {
    const project = this.find(id);
    return this.put({ ...project, extraLanes: [...project.extraLanes, lane] });
  };
  openExample = async () => {
    for (const { name, note, request, counts } of exampleProjects().reverse()) {
      const tallies = counts.map(({ want, ...key }) => ({ ...key, shown: want }));
      const lastStepKey = counts.at(-1)?.step ?? null;
      this.add(name, request, { note, tallies, lastStepKey, example: true });
    }
    return { ok: true } as const;
  };
  removeExample = async () => {
    this.show({ projects: this.current.projects.filter(({ example }) => !example) });
    return { ok: true } as const;
  };
  saveCopy = async () => JSON.stringify({ kind: 'backup', version: 1 });
  durability = async () => 'wal exclusive 2';
}

function same(one: TallyKey, other: TallyKey): boolean {
  return one.step === other.step && one.lane === other.lane && one.kind === other.kind;
}

const COLOURS = ['#EFE5D0', '#E0AC35', '#86AAB8', '#B04A37', '#263C69', '#5F6B35'];

/** Wedge fabrics from A on and a background after them. */
export function fabricsFor(wedges: number, dominant?: string): RequestFabric[] {
  return Array.from({ length: wedges + 1 }, (_, at) => {
    const letter = String.fromCharCode(65 + at);
    return {
      letter,
      name: at < wedges ? `Cloth ${letter}` : 'Ground',
      role: at < wedges ? ('wedge' as const) : ('background' as const),
      colour: at < wedges ? (COLOURS[at] ?? '#EFE5D0') : '#DDE0D8',
      oneWay: false,
      dominant: letter === dominant,
    };
  });
}

/** A ring of five fabrics, its fabric B dominant, unless told otherwise. */
export function ringRequest(choices: Partial<RingChoices> = {}): PlanRequest {
  return defaultRequest({
    block: '12',
    blocks: 5,
    wedges: 20,
    tip: 'pointed',
    centre: 'circle',
    bladeMm: 60,
    fabrics: fabricsFor(5, 'B'),
    ...choices,
  });
}
