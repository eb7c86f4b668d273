import { StyleSheet, View } from 'react-native';

import { ExampleRow } from '@/components/projects/example-row';
import { NothingYet } from '@/components/projects/nothing-yet';
import { readProject } from '@/components/projects/read-project';
import { useProjects } from '@/components/projects/use-projects';
import { type CarryOn, chooseCarryOn } from '@/components/ready/carry-on';
import { CarryOnCard } from '@/components/ready/carry-on-card';
import { OtherProjects } from '@/components/ready/other-projects';
import { StationList } from '@/components/ready/station-list';
import { listStationRows } from '@/components/ready/station-rows';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { space } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { useLayout } from '@/components/ui/use-layout';

/** `/`: what can be done now, and where. */
export function ReadyScreen() {
  const { status, projects } = useProjects();
  const readings = status.phase === 'ready' ? projects.map(readProject) : [];
  const carryOn = chooseCarryOn(readings);
  if (!carryOn) {
    return (
      <PlacePage place="ready" chip>
        <StoreGate>
          <NothingYet
            title="Nothing on the mat yet"
            text="Plan a quilt and your next cut shows up here. It stays on this device."
          />
        </StoreGate>
      </PlacePage>
    );
  }
  const rest = readings.filter((reading) => reading !== carryOn.reading);
  return (
    <PlacePage
      place="ready"
      chip
      aside={
        <View style={styles.pane}>
          <ByStation readings={readings} carryOn={carryOn} />
          <OtherProjects readings={rest} />
          {projects.some(({ example }) => example) ? <ExampleRow /> : null}
        </View>
      }
    >
      <StoreGate>
        <CarryOnCard carryOn={carryOn} />
      </StoreGate>
    </PlacePage>
  );
}

interface ByStationProps {
  readings: Parameters<typeof listStationRows>[0];
  carryOn: CarryOn;
}

function ByStation({ readings, carryOn }: ByStationProps) {
  const wide = useLayout().kind !== 'phone';
  return (
    <View style={[styles.stations, wide ? null : styles.below]}>
      <Txt kind="section" heading={2} style={styles.title}>
        By station
      </Txt>
      <StationList rows={listStationRows(readings, carryOn.reading)} />
    </View>
  );
}

const styles = StyleSheet.create({
  pane: { gap: space[5] },
  stations: { gap: space[2] },
  below: { marginTop: space[4] },
  title: { paddingHorizontal: 8 },
});
