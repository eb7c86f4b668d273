import { useSyncExternalStore } from 'react';

import { projects } from '@/sync/client/projects';
import type { StoreStatus } from '@/sync/client/projects-client';

const subscribe = (listener: () => void) => projects.subscribe(listener);
const status = () => projects.snapshot().status;

/** How the store on this device stands. */
export function useStoreStatus(): StoreStatus {
  return useSyncExternalStore(subscribe, status, status);
}
