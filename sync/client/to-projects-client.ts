import type { Answer, Command } from '../store/command';
import type { ActResult, ProjectsClient } from './projects-client';
import type { SnapshotBox } from './snapshot-box';

export interface CommandRoad {
  start(): Promise<void>;
  /** Resolves once the act is on disk and its changes are in the box. */
  call(command: Command): Promise<Answer>;
  /** New UUIDv7s. */
  newIds(count: number): Promise<string[]>;
}

const GONE: ActResult = { ok: false, kind: 'failed', detail: 'no such project' };

/** The client that components see, over any road to the one store. */
export function toProjectsClient(box: SnapshotBox, road: CommandRoad): ProjectsClient {
  const find = (id: string) => box.get().projects.find((project) => project.id === id);
  const act = async (command: Command & { id: string }): Promise<ActResult> => {
    const before = find(command.id);
    const answer = await road.call(command);
    if (!answer.ok) return answer;
    const project = find(command.id) ?? before; // gone by now: as it was
    return project ? { ok: true, project } : GONE;
  };
  const simple = async (command: Command) => {
    const answer = await road.call(command);
    return answer.ok ? ({ ok: true } as const) : answer;
  };
  const ask = async (command: Command) => {
    const answer = await road.call(command);
    if (answer.ok) return answer.text ?? '';
    throw new Error(answer.kind === 'failed' ? answer.detail : answer.kind);
  };
  return {
    start: road.start,
    snapshot: box.get,
    subscribe: box.subscribe,
    create: async ({ name, note = '', request }) => {
      const [id = ''] = await road.newIds(1);
      return act({ do: 'create', id, name, note, request });
    },
    rename: (id, name) => act({ do: 'rename', id, name }),
    remove: (id) => act({ do: 'remove', id }),
    restore: (id) => act({ do: 'restore', id }),
    tap: (id, key, delta) => act({ do: 'tap', id, key, delta }),
    set: (id, key, want) => act({ do: 'set', id, key, want }),
    undo: (id, steps) => act({ do: 'undo', id, steps }),
    addLane: (id, lane) => act({ do: 'addLane', id, lane }),
    openExample: () => simple({ do: 'openExample' }),
    removeExample: () => simple({ do: 'removeExample' }),
    saveCopy: () => ask({ do: 'saveCopy' }),
    durability: () => ask({ do: 'durability' }),
  };
}
