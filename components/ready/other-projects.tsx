import { StyleSheet, View } from 'react-native';

import { ProjectLine } from '@/components/projects/project-line';
import type { ProjectReading } from '@/components/projects/read-project';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

/** The projects that are not the one to carry on with, newest work first. */
export function OtherProjects({ readings }: { readings: readonly ProjectReading[] }) {
  const { color } = useTheme();
  if (readings.length === 0) return null;
  return (
    <View style={styles.section}>
      <Txt kind="section" heading={2} style={styles.title}>
        Other projects
      </Txt>
      <View style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}>
        {readings.map((reading) => (
          <ProjectLine key={reading.project.id} reading={reading} />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: space[2] },
  title: { paddingHorizontal: 8 },
  card: { borderWidth: border.hair, borderRadius: radius.card, overflow: 'hidden' },
});
