import { Pressable, StyleSheet, View } from 'react-native';

import { Icon, type IconName } from '@/components/ui/icon';
import { border, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressedBySpace, webOnly } from '@/components/ui/web-only';

interface CheckRowProps {
  label: string;
  icon: IconName;
  checked: boolean;
  /** the first one that is not ticked yet */
  next?: boolean | undefined;
  onPress: () => void;
  testID?: string | undefined;
}

/** A check of a list; the whole row ticks. */
export function CheckRow({ label, icon, checked, next = false, onPress, testID }: CheckRowProps) {
  const { color } = useTheme();
  const rest = next && !checked ? color.mossTint : color.card;
  return (
    <Pressable
      role="checkbox"
      aria-checked={checked}
      {...webOnly({ dataSet: { ring: 'inside' } })}
      {...pressedBySpace(onPress)}
      {...(testID && { testID })}
      onPress={onPress}
      style={({ pressed }) => [
        styles.row,
        { backgroundColor: pressed ? color.sunk : rest, borderColor: color.line },
      ]}
    >
      <View
        style={[
          styles.circle,
          checked
            ? { backgroundColor: color.moss, borderColor: color.mossInk, borderWidth: 1.5 }
            : { backgroundColor: color.card, borderColor: color.edge },
        ]}
      >
        {checked && <Icon name="check" size={20} color="onMoss" stroke={2.6} />}
      </View>
      <Txt style={[styles.label, !checked && styles.open]}>{label}</Txt>
      <Icon name={icon} size={24} color="ink2" />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: size.row,
    borderBottomWidth: border.hair,
    paddingLeft: 16,
    paddingRight: 20,
    paddingVertical: 8,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 14,
  },
  circle: {
    width: 32,
    height: 32,
    borderRadius: 16,
    borderWidth: border.zone,
    alignItems: 'center',
    justifyContent: 'center',
  },
  label: { flex: 1, fontSize: 18, lineHeight: 22 },
  open: { fontFamily: font.bold },
});
