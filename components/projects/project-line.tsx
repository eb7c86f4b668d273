import { type Href, Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';

import { countLine, pickCurrentStep, stepsLine } from '@/components/projects/progress-texts';
import type { ProjectReading } from '@/components/projects/read-project';
import { Icon } from '@/components/ui/icon';
import { Meter } from '@/components/ui/meter';
import { StationBadge } from '@/components/ui/station-badge';
import { size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

/** A project in a list: where it stands, and how far that step is. */
export function ProjectLine({ reading }: { reading: ProjectReading }) {
  const { project, progress } = reading;
  const theme = useTheme();
  const step = pickCurrentStep(progress.steps, project.lastStepKey);
  const station = step?.station ?? 'table';
  return (
    <Link href={`/projects/${project.id}` as Href} asChild>
      <Pressable
        role="link"
        testID="project-line"
        style={StyleSheet.flatten([styles.row, { borderColor: theme.color.line }])}
      >
        <StationBadge station={station} ready={step !== null} />
        <View style={styles.words}>
          <Txt style={styles.name}>{project.name}</Txt>
          {step ? (
            <>
              <Txt color="ink2">{countLine(step)}</Txt>
              <Meter
                value={step.good}
                of={step.target}
                color={theme.station(station).ink}
                label={project.name}
              />
            </>
          ) : null}
          <Txt kind="small" color="ink2">
            {stepsLine(progress.steps)}
          </Txt>
        </View>
        <Icon name="chevron" color="ink2" />
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: size.rowWide,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    paddingHorizontal: 14,
    paddingVertical: 10,
    borderBottomWidth: 1,
  },
  words: { flex: 1, minWidth: 0, gap: 4 },
  name: { fontFamily: font.bold },
});
