import type { StoreStatus } from '@/sync/client/projects-client';

/** Where the counts are, and how firmly the browser holds them. */
export function storageText({ phase, role, storage, persisted }: StoreStatus): string {
  if (phase === 'starting') return 'Opening';
  if (phase === 'failed') return 'Did not open';
  if (storage === 'memory') return 'This browser only, until its data is cleared';
  const firm =
    persisted === true ? ', kept for good' : persisted === false ? ', not promised to stay' : '';
  const tab = role === 'follower' ? ', through another tab' : '';
  return `On this device${firm}${tab}`;
}

/** Whether the server answers; without it everything but sharing works. */
export function serverText(
  status: 'pending' | 'error' | 'success',
  fetching: 'fetching' | 'paused' | 'idle',
): string {
  if (fetching === 'paused') return 'No network. Everything here works without it.';
  if (fetching === 'fetching' && status !== 'error') return 'Asking';
  return status === 'success' ? 'Answers' : 'Does not answer. Everything here works without it.';
}
