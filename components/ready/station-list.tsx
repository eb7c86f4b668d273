import { StyleSheet, View } from 'react-native';

import { readyNumber, stepLine } from '@/components/projects/progress-texts';
import { stationHref } from '@/components/projects/station-href';
import { StationLine } from '@/components/projects/station-line';
import type { StationRow } from '@/components/ready/station-rows';
import { stepTitle } from '@/components/steps/messages';
import { border, radius, useTheme } from '@/components/ui/theme';

function writeLine({ reading, step, other, moreProjects }: StationRow): string {
  const own = stepLine(step);
  const named = other ? `${reading.project.name}: ${own}` : own;
  if (moreProjects === 0) return named;
  return `${named}, and ${moreProjects} more ${moreProjects === 1 ? 'project' : 'projects'}`;
}

/** One row a station, the number first. */
export function StationList({ rows }: { rows: readonly StationRow[] }) {
  const { color } = useTheme();
  return (
    <View style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}>
      {rows.map((row) => {
        const { station, state, reading, step } = row;
        const planned = reading.project.steps.find(({ key }) => key === step.key);
        return (
          <StationLine
            key={station}
            station={station}
            state={state}
            href={stationHref(reading.project.id, station, step.role)}
            task={planned ? stepTitle(planned) : ''}
            line={writeLine(row)}
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
