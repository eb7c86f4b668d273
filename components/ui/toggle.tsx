import { Pressable, StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { border, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressable, pressedBySpace } from '@/components/ui/web-only';

interface ToggleProps {
  label: string;
  hint?: string | undefined;
  value: boolean;
  onChange: (value: boolean) => void;
  testID?: string | undefined;
}

/** A row that switches something on or off. */
export function Toggle({ label, hint, value, onChange, testID }: ToggleProps) {
  const { color } = useTheme();
  return (
    <Pressable
      {...pressable}
      {...pressedBySpace(() => onChange(!value))}
      {...(testID && { testID })}
      role="switch"
      aria-checked={value}
      onPress={() => onChange(!value)}
      style={styles.row}
    >
      <View style={styles.words}>
        <Txt style={styles.label}>{label}</Txt>
        {hint ? (
          <Txt kind="small" color="ink2">
            {hint}
          </Txt>
        ) : null}
      </View>
      <View
        style={[
          styles.track,
          { borderColor: value ? color.action : color.edge },
          { backgroundColor: value ? color.action : color.sunk },
        ]}
      >
        <View
          style={[
            styles.thumb,
            value && styles.thumbOn,
            { backgroundColor: value ? color.onAction : color.edge },
          ]}
        >
          {value && <Icon name="check" size={16} color="action" stroke={3} />}
        </View>
      </View>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: size.row,
    borderRadius: 14,
    paddingVertical: 8,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 16,
  },
  words: { flex: 1, gap: 2 },
  label: { fontFamily: font.strong },
  track: { width: 56, height: 32, borderRadius: 16, borderWidth: border.control, padding: 2.5 },
  thumb: {
    width: 24,
    height: 24,
    borderRadius: 12,
    alignItems: 'center',
    justifyContent: 'center',
  },
  thumbOn: { alignSelf: 'flex-end' },
});
