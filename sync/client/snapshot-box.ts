import type { ProjectView, StoreSnapshot, StoreStatus } from './projects-client';

/** The one place that screens look at: a snapshot that is replaced, never changed. */
export interface SnapshotBox {
  get(): StoreSnapshot;
  subscribe(listener: () => void): () => void;
  show(next: { status?: Partial<StoreStatus>; projects?: readonly ProjectView[] }): void;
}

const STARTING: StoreStatus = {
  phase: 'starting',
  role: 'starting',
  storage: null,
  persisted: null,
  failure: null,
};

export function createSnapshotBox(): SnapshotBox {
  const listeners = new Set<() => void>();
  let snapshot: StoreSnapshot = { status: STARTING, projects: [] };
  return {
    get: () => snapshot,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    show({ status, projects = snapshot.projects }) {
      const next = status ? { ...snapshot.status, ...status } : snapshot.status;
      snapshot = { status: next, projects };
      listeners.forEach((listener) => listener());
    },
  };
}
