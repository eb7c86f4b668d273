import { type Ref } from 'react';
import { StyleSheet, type Text, View } from 'react-native';

import { IconButton } from '@/components/ui/icon-button';
import { Txt } from '@/components/ui/txt';

interface StepHeadProps {
  title: string;
  titleRef: Ref<Text>;
  onAbout: () => void;
}

/** The instruction, and the way to all there is to know about the step. */
export function StepHead({ title, titleRef, onAbout }: StepHeadProps) {
  return (
    <View style={styles.row}>
      <Txt kind="step" heading={1} tabIndex={-1} ref={titleRef} style={styles.title}>
        {title}
      </Txt>
      <IconButton icon="info" label="About this step" onPress={onAbout} testID="about" />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: 4, paddingLeft: 4 },
  title: { flex: 1, borderRadius: 6 },
});
