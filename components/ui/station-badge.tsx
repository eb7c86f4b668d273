import { StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { border, size as sizes, useTheme } from '@/components/ui/theme';
import type { Station } from '@/shared/model/codes';

interface StationBadgeProps {
  station: Station;
  size?: 44 | 32 | undefined;
  /** filled when something is ready there, tinted when not yet; its word always stands beside it */
  ready?: boolean | undefined;
}

/** A station's sign on its dye. */
export function StationBadge({ station, size = 44, ready = true }: StationBadgeProps) {
  const dye = useTheme().station(station);
  const small = size === sizes.badgeSmall;
  return (
    <View
      style={[
        styles.badge,
        { width: size, height: size, borderRadius: small ? 10 : 13 },
        { backgroundColor: ready ? dye.fill : dye.tint, borderColor: ready ? dye.ink : dye.tint },
      ]}
    >
      <Icon name={station} size={small ? 19 : 25} color={ready ? dye.onFill : dye.ink} />
    </View>
  );
}

const styles = StyleSheet.create({
  badge: {
    alignItems: 'center',
    justifyContent: 'center',
    borderWidth: border.control,
    flexShrink: 0,
  },
});
