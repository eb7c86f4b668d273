import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Txt } from '@/components/ui/txt';

/** A headed group of settings. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <View style={styles.section}>
      <Txt kind="section" heading={2}>
        {title}
      </Txt>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({ section: { gap: 10 } });
