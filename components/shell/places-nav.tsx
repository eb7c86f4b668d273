import { StyleSheet, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { PlaceLink } from '@/components/shell/place-link';
import { PLACES, type Place } from '@/components/shell/places';
import { Icon } from '@/components/ui/icon';
import { border, size, useTheme } from '@/components/ui/theme';

/** The bar at the bottom of a phone. */
export function PlacesBar({ here }: { here: Place }) {
  const { color } = useTheme();
  const { bottom } = useSafeAreaInsets();
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[
        styles.bar,
        {
          backgroundColor: color.card,
          borderColor: color.line,
          paddingBottom: Math.max(12, bottom),
        },
      ]}
    >
      {PLACES.map((link) => (
        <PlaceLink key={link.place} link={link} here={here} />
      ))}
    </View>
  );
}

/** The rail at the side of a wide screen. */
export function PlacesRail({ here }: { here: Place }) {
  const { color } = useTheme();
  return (
    <View
      role="navigation"
      aria-label="Places"
      style={[styles.rail, { backgroundColor: color.card, borderColor: color.line }]}
    >
      <View style={styles.mark}>
        <Icon name="matside" size={40} />
      </View>
      {PLACES.map((link) => (
        <PlaceLink key={link.place} link={link} here={here} rail />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    minHeight: size.placesBar,
    borderTopWidth: border.hair,
    paddingHorizontal: 6,
    paddingTop: 6,
    flexDirection: 'row',
  },
  rail: {
    width: size.rail,
    borderRightWidth: border.hair,
    alignItems: 'center',
    paddingVertical: 18,
    gap: 8,
  },
  mark: { marginTop: 2, marginBottom: 12 },
});
