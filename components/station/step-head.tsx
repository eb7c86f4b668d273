import type { Ref } from 'react';
import { StyleSheet, type Text } from 'react-native';

import { Txt } from '@/components/ui/txt';

/** The instruction; the focus starts on it. */
export function StepHead({ title, titleRef }: { title: string; titleRef: Ref<Text> }) {
  return (
    <Txt kind="step" heading={1} tabIndex={-1} ref={titleRef} style={styles.title}>
      {title}
    </Txt>
  );
}

const styles = StyleSheet.create({
  title: { paddingVertical: 6, borderRadius: 6 },
});
