import { Pressable, type StyleProp, StyleSheet, type ViewStyle } from 'react-native';

import { darken } from '@/components/ui/darken';
import { Icon, type IconName } from '@/components/ui/icon';
import { border, radius, size, type Theme, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { pressable, webOnly } from '@/components/ui/web-only';
import type { Station } from '@/shared/model/codes';

export type ButtonKind = 'main' | 'station' | 'second' | 'quiet' | 'danger';

/** A button of a dialog, a note, an empty or a broken page. */
export interface Action {
  label: string;
  icon?: IconName | undefined;
  kind?: ButtonKind | undefined;
  onPress: () => void;
  testID?: string | undefined;
}

export interface ButtonProps extends Action {
  station?: Station | undefined;
  small?: boolean | undefined;
  /** something is missing first: the label says what, and pressing points to it */
  waiting?: boolean | undefined;
  accessibilityLabel?: string | undefined;
  /** whether what it opens is open, and that thing's id */
  expands?: { id: string; open: boolean } | undefined;
  style?: StyleProp<ViewStyle>;
}

interface Paint {
  fill: string;
  pressed: string;
  text: string;
  edge: string;
}

function paint(theme: Theme, kind: ButtonKind, station: Station | undefined): Paint {
  const { color } = theme;
  const filled = (fill: string, text: string, edge: string) => {
    return { fill, pressed: darken(fill), text, edge };
  };
  if (kind === 'main') return filled(color.action, color.onAction, color.action);
  if (kind === 'danger') return filled(color.madder, color.onMadder, color.madderInk);
  if (kind === 'station') {
    const dye = theme.station(station ?? 'table');
    return filled(dye.fill, dye.onFill, dye.ink);
  }
  const quiet = kind === 'quiet';
  return {
    fill: quiet ? 'transparent' : color.card,
    pressed: color.sunk,
    text: color.ink,
    edge: quiet ? 'transparent' : color.edge,
  };
}

export function Button(props: ButtonProps) {
  const { label, icon, kind = 'main', station, small = false, waiting = false } = props;
  const theme = useTheme();
  const { sunk, ink2, edge } = theme.color;
  const look = waiting
    ? { fill: sunk, pressed: darken(sunk), text: ink2, edge }
    : paint(theme, kind, station);
  return (
    <Pressable
      {...pressable}
      role="button"
      onPress={props.onPress}
      {...(props.testID && { testID: props.testID })}
      {...(props.accessibilityLabel && { 'aria-label': props.accessibilityLabel })}
      {...(props.expands && {
        'aria-expanded': props.expands.open,
        ...webOnly({ 'aria-controls': props.expands.id }),
      })}
      style={({ pressed }) => [
        styles.button,
        small && styles.small,
        { backgroundColor: pressed ? look.pressed : look.fill, borderColor: look.edge },
        waiting && styles.waiting,
        props.style,
      ]}
    >
      {icon && <Icon name={icon} size={small ? 20 : 22} color={look.text} stroke={2.4} />}
      <Txt
        kind="lead"
        color={look.text}
        align="center"
        style={[styles.label, small && styles.smallLabel, kind === 'quiet' && styles.underlined]}
      >
        {label}
      </Txt>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  button: {
    minHeight: size.button,
    maxWidth: '100%',
    borderRadius: radius.button,
    borderWidth: border.control,
    paddingHorizontal: 20,
    paddingVertical: 6,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 10,
  },
  small: { minHeight: size.buttonSmall, borderRadius: 15, paddingHorizontal: 14, gap: 8 },
  waiting: { borderStyle: 'dashed' },
  label: { flexShrink: 1 },
  smallLabel: { fontSize: 16, lineHeight: 20 },
  underlined: { textDecorationLine: 'underline' },
});
