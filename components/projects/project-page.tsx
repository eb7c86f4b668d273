import { router } from 'expo-router';
import type { ReactNode } from 'react';

import type { ProjectReading } from '@/components/projects/read-project';
import { useProject } from '@/components/projects/use-project';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { ErrorState } from '@/components/ui/error-state';

interface ProjectPageProps {
  id: string;
  /** the page's title once the project is open */
  title: (reading: ProjectReading) => string;
  back: (reading: ProjectReading) => { label: string; href: string };
  children: (reading: ProjectReading) => ReactNode;
  aside?: (reading: ProjectReading) => ReactNode;
}

const ALL = { label: 'Projects', href: '/projects' } as const;

/** A page about one project: opening, not here, did not open, or the project. */
export function ProjectPage({ id, title, back, children, aside }: ProjectPageProps) {
  const state = useProject(id);
  if (state.state !== 'ready') {
    return (
      <PlacePage place="projects" title="Project" back={ALL}>
        <StoreGate>
          <ErrorState
            title="This project is not here"
            text="It may be on another device, or it was deleted. Your other projects are kept."
            actions={[{ label: 'All projects', onPress: () => router.replace('/projects') }]}
          />
        </StoreGate>
      </PlacePage>
    );
  }
  return (
    <PlacePage
      place="projects"
      title={title(state)}
      chip
      back={back(state) as typeof ALL}
      aside={aside?.(state)}
    >
      {children(state)}
    </PlacePage>
  );
}
