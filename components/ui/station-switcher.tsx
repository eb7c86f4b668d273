import { Pressable, StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { STATION_NAMES } from '@/components/ui/stations';
import { border, radius, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { useTextScale } from '@/components/ui/use-text-scale';
import { pressable, pressedBySpace } from '@/components/ui/web-only';
import type { Station } from '@/shared/model/codes';

interface StationSwitcherProps {
  /** those the plan has steps for, in the order of work */
  stations: readonly Station[];
  station: Station;
  /** what is ready at each; no number where nothing is */
  ready: Partial<Record<Station, number>>;
  onChange: (station: Station) => void;
}

/** The tabs on top of a station page. */
export function StationSwitcher({ stations, station, ready, onChange }: StationSwitcherProps) {
  const { color } = useTheme();
  return (
    <View
      role="tablist"
      aria-label="Stations"
      style={[styles.bar, { backgroundColor: color.sunk }]}
    >
      {stations.map((each) => (
        <Tab
          key={each}
          station={each}
          on={each === station}
          count={ready[each] ?? 0}
          onPress={() => onChange(each)}
        />
      ))}
    </View>
  );
}

interface TabProps {
  station: Station;
  on: boolean;
  count: number;
  onPress: () => void;
}

function Tab({ station, on, count, onPress }: TabProps) {
  const theme = useTheme();
  const scale = useTextScale();
  const dye = theme.station(station);
  const name = STATION_NAMES[station];
  return (
    <Pressable
      {...pressable}
      {...pressedBySpace(onPress)}
      role="tab"
      aria-selected={on}
      {...deviceName(count > 0 && !on ? `${name}, ${count} ready` : name)}
      testID={`station-${station}`}
      onPress={onPress}
      style={[
        styles.tab,
        { flexBasis: 54 * scale },
        on && { backgroundColor: dye.fill, borderColor: dye.ink },
      ]}
    >
      <Icon name={station} size={22} color={on ? dye.onFill : dye.ink} />
      <Txt
        kind="nav"
        numberOfLines={1}
        color={on ? dye.onFill : 'ink2'}
        style={on ? styles.on : null}
      >
        {name}
      </Txt>
      {count > 0 && !on && (
        <View style={[styles.count, { backgroundColor: theme.color.card, borderColor: dye.ink }]}>
          <Txt kind="header" color={dye.ink} style={styles.number}>
            {count}
          </Txt>
          <Spoken>ready</Spoken>
        </View>
      )}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: 4,
    padding: 4,
    borderRadius: radius.switcher,
  },
  tab: {
    flexGrow: 1,
    minWidth: size.touchMin,
    minHeight: size.touchMin,
    borderRadius: 14,
    borderWidth: border.control,
    borderColor: 'transparent',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
  },
  on: { fontFamily: font.bold },
  count: {
    position: 'absolute',
    top: 2,
    right: 4,
    minWidth: 19,
    minHeight: 19,
    paddingHorizontal: 4,
    borderRadius: 10,
    borderWidth: border.hair,
    alignItems: 'center',
    justifyContent: 'center',
  },
  number: { fontFamily: font.bold },
});
