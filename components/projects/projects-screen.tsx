import { router } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { ExampleRow } from '@/components/projects/example-row';
import { NothingYet } from '@/components/projects/nothing-yet';
import { ProjectLine } from '@/components/projects/project-line';
import { readProject } from '@/components/projects/read-project';
import { useExample } from '@/components/projects/use-example';
import { useProjects } from '@/components/projects/use-projects';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { Button } from '@/components/ui/button';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import type { ProjectView } from '@/sync/client/projects-client';

/** `/projects`: everything made on this device, newest work first. */
export function ProjectsScreen() {
  const { projects } = useProjects();
  return (
    <PlacePage place="projects" chip>
      <StoreGate>
        {projects.length > 0 ? (
          <ProjectList projects={projects} />
        ) : (
          <NothingYet
            title="No projects yet"
            text="Plan a quilt and it is kept here, on this device."
          />
        )}
      </StoreGate>
    </PlacePage>
  );
}

function ProjectList({ projects }: { projects: readonly ProjectView[] }) {
  const { color } = useTheme();
  const { open } = useExample();
  const example = projects.some((project) => project.example);
  return (
    <View style={styles.list}>
      <View style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}>
        {projects.map((project) => (
          <ProjectLine key={project.id} reading={readProject(project)} />
        ))}
      </View>
      <Button
        label="Plan a quilt"
        icon="plus"
        onPress={() => router.push('/projects/new')}
        testID="plan-a-quilt"
      />
      {example ? (
        <ExampleRow />
      ) : (
        <Button
          label="Open the example"
          kind="quiet"
          onPress={() => void open()}
          testID="open-example"
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[4] },
  card: { borderWidth: border.hair, borderRadius: radius.card, overflow: 'hidden' },
});
