import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { useToast } from '@/components/providers/toast';
import { failureTexts } from '@/components/shell/store-texts';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { projects } from '@/sync/client/projects';
import type { ProjectView } from '@/sync/client/projects-client';

/** Renames the project where it stands. */
export function ProjectName({ project }: { project: ProjectView }) {
  const [typed, setTyped] = useState<string | null>(null);
  const { show } = useToast();
  if (typed === null) {
    return (
      <Button
        label="Rename"
        icon="pencil"
        kind="second"
        onPress={() => setTyped(project.name)}
        testID="rename"
      />
    );
  }
  const name = typed.trim();
  const save = async () => {
    if (name === '') return;
    if (name !== project.name) {
      const renamed = await projects.rename(project.id, name);
      if (!renamed.ok) return show({ text: failureTexts(renamed).title });
    }
    setTyped(null);
  };
  return (
    <View style={styles.field}>
      <Field
        label="Project name"
        value={typed}
        onChangeText={setTyped}
        error={name === '' ? 'No name yet. One word is enough.' : undefined}
        maxLength={80}
        testID="project-name"
      />
      <Button
        label="Save the name"
        icon="check"
        kind="second"
        waiting={name === ''}
        onPress={() => void save()}
        testID="save-name"
      />
    </View>
  );
}

const styles = StyleSheet.create({ field: { gap: 10 } });
