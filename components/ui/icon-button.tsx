import { Pressable, StyleSheet } from 'react-native';

import { Icon, type IconName } from '@/components/ui/icon';
import { size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { pressable, webOnly } from '@/components/ui/web-only';

interface IconButtonProps {
  icon: IconName;
  label: string;
  /** the label stands under the icon, as in a station's header */
  word?: boolean | undefined;
  /** switched on; leave it out where there is nothing to switch */
  lit?: boolean | undefined;
  onPress: () => void;
  testID?: string | undefined;
}

export function IconButton({ icon, label, word = false, lit, onPress, testID }: IconButtonProps) {
  const { color } = useTheme();
  const ink = word && lit !== true ? color.ink2 : color.ink;
  return (
    <Pressable
      {...pressable}
      {...(lit !== undefined && webOnly({ 'aria-pressed': lit }))}
      {...(testID && { testID })}
      role="button"
      aria-label={label}
      onPress={onPress}
      style={({ pressed }) => [
        styles.button,
        word && styles.worded,
        pressed && { backgroundColor: color.sunk },
      ]}
    >
      <Icon name={icon} size={word ? 22 : 24} color={ink} />
      {word && (
        <Txt kind="header" color={ink} numberOfLines={1}>
          {label}
        </Txt>
      )}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  button: {
    minWidth: size.touchMin,
    minHeight: size.touchMin,
    borderRadius: 14,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
  },
  worded: { minWidth: 56, paddingHorizontal: 2 },
});
