import { useLocalSearchParams, router } from 'expo-router';

import { useProject } from '@/components/projects/use-project';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { StationPage } from '@/components/station/station-page';
import { EmptyState } from '@/components/ui/empty-state';
import { STATION_NAMES } from '@/components/ui/stations';
import { type Station, STATIONS } from '@/shared/model/codes';

/** `/projects/[id]/[station]`: the station, or what stands in its place. */
export function StationScreen() {
  const { id, station, step } = useLocalSearchParams<Record<'id' | 'station' | 'step', string>>();
  const project = useProject(id);
  const known = STATIONS.find((each) => each === station);
  if (project.state !== 'ready' || !known) {
    return (
      <Instead
        page={known ? STATION_NAMES[known] : 'Station'}
        title="Not on this device"
        text="This device has no such project or station."
      />
    );
  }
  if (!project.progress.steps.some((each) => each.station === known)) {
    return <NoSteps station={known} />;
  }
  return (
    <StationPage
      key={project.project.id}
      project={project.project}
      progress={project.progress}
      station={known}
      role={step}
    />
  );
}

function NoSteps({ station }: { station: Station }) {
  const name = STATION_NAMES[station];
  return (
    <Instead
      page={name}
      title={`Nothing at the ${name}`}
      text={`This plan has no steps at the ${name}.`}
    />
  );
}

/** While the store opens, when it did not, and when there is nothing to show. */
function Instead({ page, title, text }: Record<'page' | 'title' | 'text', string>) {
  return (
    <PlacePage place="projects" title={page} back={{ label: 'Projects', href: '/projects' }}>
      <StoreGate>
        <EmptyState
          title={title}
          text={text}
          actions={[{ label: 'Open Ready', onPress: () => router.replace('/') }]}
        />
      </StoreGate>
    </PlacePage>
  );
}
