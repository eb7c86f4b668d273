import { type ProjectReading, readProject } from '@/components/projects/read-project';
import { useProjects } from '@/components/projects/use-projects';
import type { StoreFailure } from '@/sync/client/projects-client';

export type ProjectState =
  | { state: 'loading' }
  | { state: 'missing' }
  | { state: 'failed'; failure: StoreFailure }
  | ({ state: 'ready' } & ProjectReading);

/** One project by its id, with its plan (made once a request) and its progress. */
export function useProject(id: string): ProjectState {
  const { status, projects } = useProjects();
  const project = projects.find((candidate) => candidate.id === id);
  if (project) return { state: 'ready', ...readProject(project) };
  if (status.failure) return { state: 'failed', failure: status.failure };
  return status.phase === 'starting' ? { state: 'loading' } : { state: 'missing' };
}
