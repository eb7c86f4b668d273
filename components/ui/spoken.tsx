import { Platform, StyleSheet, Text } from 'react-native';

/** Words for screen readers only. */
export function Spoken({ children }: { children: string }) {
  return <Text style={styles.unseen}>{children}</Text>;
}

/**
 * A control's name on a device. In a browser its name is its contents, `Spoken` words included: an
 * aria-label beside visible words of another order would part the two for who speaks to the page.
 */
export function deviceName(name: string): { 'aria-label'?: string } {
  return Platform.OS === 'web' ? {} : { 'aria-label': name };
}

const styles = StyleSheet.create({
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
});
