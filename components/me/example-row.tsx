import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { useProjects } from '@/components/projects/use-projects';
import { useToast } from '@/components/providers/toast';
import { failureTexts } from '@/components/shell/store-texts';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Txt } from '@/components/ui/txt';
import { projects } from '@/sync/client/projects';

/** Opens the example's projects on this device, or takes them away again. */
export function ExampleRow() {
  const open = useProjects().projects.some(({ example }) => example);
  const [asking, setAsking] = useState(false);
  const toast = useToast();
  const act = async (what: 'openExample' | 'removeExample') => {
    setAsking(false);
    const result = await projects[what]();
    const done = what === 'openExample' ? 'Three example projects opened.' : 'Example taken away.';
    toast.show({ text: result.ok ? done : failureTexts(result).title });
  };
  return (
    <View style={styles.row}>
      <Txt>
        {open
          ? 'The example’s three projects are among yours. Take them away when you have seen enough.'
          : 'Three made-up projects to look around in. They go again in one tap.'}
      </Txt>
      {open ? (
        <Button
          label="Take the example away"
          icon="trash"
          kind="second"
          onPress={() => setAsking(true)}
          testID="remove-example"
          style={styles.button}
        />
      ) : (
        <Button
          label="Open the example"
          icon="layers"
          kind="second"
          onPress={() => void act('openExample')}
          testID="open-example"
          style={styles.button}
        />
      )}
      <Dialog
        open={asking}
        title="Take the example away?"
        text="Its three projects and what you counted in them go for good. Your own projects stay."
        onClose={() => setAsking(false)}
        actions={[
          { label: 'Keep it', onPress: () => setAsking(false) },
          {
            label: 'Take it away',
            kind: 'danger',
            onPress: () => void act('removeExample'),
            testID: 'remove-example-yes',
          },
        ]}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { gap: 10 },
  button: { alignSelf: 'flex-start' },
});
