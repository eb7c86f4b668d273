import { useEffect, useSyncExternalStore } from 'react';

import { projects } from '@/sync/client/projects';
import type { StoreSnapshot } from '@/sync/client/projects-client';

const subscribe = (listener: () => void) => projects.subscribe(listener);
const snapshot = () => projects.snapshot();

/** Everything kept on this device, as it stands now; opens the store when nobody has yet. */
export function useProjects(): StoreSnapshot {
  const current = useSyncExternalStore(subscribe, snapshot, snapshot);
  useEffect(() => {
    if (projects.snapshot().status.phase === 'starting') void projects.start();
  }, []);
  return current;
}
