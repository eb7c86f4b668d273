import type { StoreStatus } from '@/sync/client/projects-client';

const READY: StoreStatus = {
  phase: 'ready',
  role: 'leader',
  storage: 'private',
  persisted: true,
  failure: null,
};
const listeners = new Set<() => void>();
let snapshot = { status: READY, projects: [] };

/** The part of the store that the shell looks at, with its status set by a test. */
export const projects = {
  started: 0,
  start: async () => void (projects.started += 1),
  saveCopy: async () => '{"kind":"backup"}',
  snapshot: () => snapshot,
  subscribe: (listener: () => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  stand: (status: Partial<StoreStatus>) => {
    snapshot = { ...snapshot, status: { ...READY, ...status } };
    listeners.forEach((listener) => listener());
  },
};
