import { StyleSheet, Text, View } from 'react-native';

import { useThrottled } from '@/components/ui/use-throttled';

const ONCE_A_SECOND_MS = 1000;

/** Words for screen readers only, read politely when they change, at most once a second. */
export function Announcement({ text }: { text: string }) {
  const said = useThrottled(text, ONCE_A_SECOND_MS);
  return (
    <View role="status" aria-live="polite" style={styles.unseen}>
      <Text>{said}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  unseen: {
    position: 'absolute',
    width: 1,
    height: 1,
    overflow: 'hidden',
    opacity: 0,
  },
});
