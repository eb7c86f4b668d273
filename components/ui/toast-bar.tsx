import { Pressable, StyleSheet, View } from 'react-native';

import { radius, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { webOnly } from '@/components/ui/web-only';

export interface Toast {
  text: string;
  action?: { label: string; onPress: () => void } | undefined;
}

/** What a toast looks like: ink, 56 high, at most one underlined word to press. */
export function ToastBar({ text, action }: Toast) {
  const { color } = useTheme();
  return (
    <View style={[styles.bar, { backgroundColor: color.ink }]} testID="toast">
      <Txt color="paper" style={styles.text}>
        {text}
      </Txt>
      {action && (
        <Pressable
          role="button"
          onPress={action.onPress}
          style={styles.action}
          {...webOnly({ dataSet: { ring: 'on-ink' } })}
        >
          <Txt color="paper" style={[styles.text, styles.word]}>
            {action.label}
          </Txt>
        </Pressable>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    minHeight: 56,
    borderRadius: radius.button,
    paddingLeft: 18,
    paddingRight: 6,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: 8,
  },
  text: { fontFamily: font.strong, fontSize: 16.5, flexShrink: 1, paddingVertical: 6 },
  action: {
    minHeight: size.touchMin,
    paddingHorizontal: 16,
    borderRadius: 15,
    justifyContent: 'center',
  },
  word: { fontFamily: font.bold, textDecorationLine: 'underline' },
});
