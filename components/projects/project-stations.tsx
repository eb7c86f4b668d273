import { StyleSheet, View } from 'react-native';

import { isReady, readyNumber, stepLine } from '@/components/projects/progress-texts';
import type { ProjectReading } from '@/components/projects/read-project';
import { StationLine } from '@/components/projects/station-line';
import { stationHref } from '@/components/projects/station-href';
import { stepTitle } from '@/components/steps/messages';
import { border, radius, useTheme } from '@/components/ui/theme';
import { STATIONS } from '@/shared/model/codes';

/** The project's stations: what is ready at each, or what it waits for. */
export function ProjectStations({ reading }: { reading: ProjectReading }) {
  const { color } = useTheme();
  const { project, progress } = reading;
  const rows = STATIONS.flatMap((station) => {
    const here = progress.steps.filter((step) => step.station === station);
    const step = here.find(isReady) ?? here.find(({ toGo }) => toGo > 0) ?? here.at(-1);
    return step ? [{ station, step }] : [];
  });
  return (
    <View style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}>
      {rows.map(({ station, step }) => {
        const planned = project.steps.find(({ key }) => key === step.key);
        return (
          <StationLine
            key={station}
            station={station}
            state={isReady(step) ? 'ready' : step.toGo > 0 ? 'waiting' : 'done'}
            href={stationHref(project.id, station, step.role)}
            task={planned ? stepTitle(planned) : ''}
            line={stepLine(step)}
            {...readyNumber(step)}
            testID={`row-${station}`}
          />
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderWidth: border.hair, borderRadius: radius.card, overflow: 'hidden' },
});
