import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/ui/theme';

interface TwoPanesProps {
  left: ReactNode;
  right: ReactNode;
  /** px; without it both panes share the width */
  leftWidth?: number | undefined;
}

/** Two panes side by side, from 900 px of width on. */
export function TwoPanes({ left, right, leftWidth }: TwoPanesProps) {
  return (
    <View style={styles.panes}>
      <View style={leftWidth === undefined ? styles.pane : { width: leftWidth }}>{left}</View>
      <View style={styles.pane}>{right}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  panes: { flexDirection: 'row', gap: space[7], flexGrow: 1 },
  pane: { flex: 1, minWidth: 0 },
});
