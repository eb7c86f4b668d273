import { router } from 'expo-router';
import { useState } from 'react';

import { useToast } from '@/components/providers/toast';
import { failureTexts } from '@/components/shell/store-texts';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { projects } from '@/sync/client/projects';
import type { ProjectView } from '@/sync/client/projects-client';

/** Deletes the project after asking; the toast puts it back with every count. */
export function DeleteProject({ project }: { project: ProjectView }) {
  const [asking, setAsking] = useState(false);
  const { show } = useToast();
  const remove = async () => {
    setAsking(false);
    const removed = await projects.remove(project.id);
    if (!removed.ok) return show({ text: failureTexts(removed).title });
    router.replace('/projects');
    show({
      text: `${project.name} deleted`,
      action: { label: 'Put back', onPress: () => void projects.restore(project.id) },
    });
  };
  return (
    <>
      <Button
        label="Delete the project"
        icon="trash"
        kind="quiet"
        onPress={() => setAsking(true)}
        testID="delete-project"
      />
      <Dialog
        open={asking}
        title={`Delete ${project.name}?`}
        text="Its plan and its counts go with it. Right after, you can put it back."
        actions={[
          { label: 'Keep it', onPress: () => setAsking(false) },
          {
            label: 'Delete it',
            kind: 'danger',
            onPress: () => void remove(),
            testID: 'confirm-delete',
          },
        ]}
        onClose={() => setAsking(false)}
      />
    </>
  );
}
