import { StyleSheet, View } from 'react-native';

import type { ColorRole } from '@/components/ui/colors';
import { useTheme } from '@/components/ui/theme';

interface MeterProps {
  value: number;
  of: number;
  /** a colour role or any colour */
  color?: ColorRole | (string & {}) | undefined;
  /** what is measured; the number itself stands beside the meter */
  label?: string | undefined;
}

/** How far something is, as a thin bar. Its number always stands beside or above it. */
export function Meter({ value, of, color = 'woadInk', label }: MeterProps) {
  const theme = useTheme();
  const ink = color in theme.color ? theme.color[color as ColorRole] : color;
  const share = of > 0 ? Math.min(1, Math.max(0, value / of)) : 0;
  return (
    <View
      role="img"
      aria-label={label ? `${label}: ${value} of ${of}` : `${value} of ${of}`}
      style={[styles.bar, { borderColor: ink }]}
    >
      <View style={[styles.fill, { width: `${share * 100}%`, backgroundColor: ink }]} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { height: 10, borderRadius: 5, borderWidth: 1.5, overflow: 'hidden' },
  fill: { height: '100%' },
});
