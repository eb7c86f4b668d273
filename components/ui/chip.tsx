import { Pressable, StyleSheet, View } from 'react-native';

import { Icon, type IconName } from '@/components/ui/icon';
import { border, size, type Theme, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { webOnly } from '@/components/ui/web-only';
import type { Station } from '@/shared/model/codes';

export type ChipTone = 'plain' | 'station' | 'info' | 'done' | 'caution' | 'error';

export interface ChipProps {
  label: string;
  icon?: IconName | undefined;
  tone?: ChipTone | undefined;
  station?: Station | undefined;
  onPress?: (() => void) | undefined;
  selected?: boolean | undefined;
  tall?: boolean | undefined;
  testID?: string | undefined;
}

function tint(theme: Theme, tone: ChipTone, station: Station): { fill: string; ink: string } {
  const { color } = theme;
  if (tone === 'station')
    return { fill: theme.station(station).tint, ink: theme.station(station).ink };
  if (tone === 'info') return { fill: color.woadTint, ink: color.woadInk };
  if (tone === 'done') return { fill: color.mossTint, ink: color.mossInk };
  if (tone === 'caution') return { fill: color.weldTint, ink: color.weldInk };
  if (tone === 'error') return { fill: color.madderTint, ink: color.madderInk };
  return { fill: color.sunk, ink: color.ink };
}

/** A fact in a pill; with `onPress` it can be tapped and gets a tall hit area. */
export function Chip(props: ChipProps) {
  const { label, icon, tone = 'plain', station = 'table', onPress, selected = false } = props;
  const theme = useTheme();
  const { fill, ink } = tint(theme, tone, station);
  const pill = (
    <View
      {...(!onPress && props.testID && { testID: props.testID })}
      style={[
        styles.pill,
        props.tall && styles.tall,
        { backgroundColor: fill, borderColor: selected ? theme.color.edge : fill },
      ]}
    >
      {icon && <Icon name={icon} size={18} color={ink} />}
      <Txt kind="small" color={ink} style={[styles.label, selected && styles.bold]}>
        {label}
      </Txt>
    </View>
  );
  if (!onPress) return pill;
  return (
    <Pressable
      role="button"
      onPress={onPress}
      style={styles.hit}
      {...(props.testID && { testID: props.testID })}
      {...webOnly({ 'aria-pressed': props.selected })}
    >
      {pill}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  hit: { minHeight: size.touchMin, justifyContent: 'center', borderRadius: 17 },
  pill: {
    minHeight: size.chip,
    borderRadius: 17,
    borderWidth: border.control,
    paddingLeft: 10,
    paddingRight: 12,
    paddingVertical: 4,
    flexDirection: 'row',
    alignItems: 'center',
    alignSelf: 'flex-start',
    maxWidth: '100%',
    gap: 7,
  },
  tall: { minHeight: size.syncChip, borderRadius: 18 },
  label: { fontFamily: font.strong, flexShrink: 1 },
  bold: { fontFamily: font.bold },
});
