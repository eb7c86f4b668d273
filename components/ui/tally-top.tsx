import { StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Station } from '@/shared/model/codes';

interface TallyTopProps {
  station: Station;
  perTap: number;
  full: boolean;
  locked: boolean;
}

/** What a tap adds and what else counts; or that the zone is locked. */
export function TallyTop({ station, perTap, full, locked }: TallyTopProps) {
  const theme = useTheme();
  const dye = theme.station(station);
  const ink = full ? dye.ink : dye.onFill;
  const onPill = full || theme.name === 'day' ? (full ? dye.tint : dye.fill) : theme.color.paper;
  return (
    <View style={styles.top} aria-hidden>
      <View style={[styles.pill, { backgroundColor: ink }]}>
        <Icon name={locked ? 'lock' : 'plus'} size={20} color={onPill} stroke={locked ? 2.4 : 3} />
        <Txt color={onPill} style={styles.pillText}>
          {locked ? 'Hold to unlock' : `${perTap} a tap`}
        </Txt>
      </View>
      {!locked && (
        <View style={styles.keys}>
          <Icon name="keyboard" size={20} color={ink} />
          <Txt color={ink} style={styles.keysText}>
            Pedal or Space
          </Txt>
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  top: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'center',
    columnGap: 8,
    paddingHorizontal: 16,
    paddingTop: 14,
  },
  pill: {
    minHeight: 34,
    borderRadius: 17,
    paddingLeft: 10,
    paddingRight: 14,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 6,
  },
  pillText: { fontFamily: font.bold, fontSize: 17, lineHeight: 22 },
  keys: { flexDirection: 'row', alignItems: 'center', gap: 7 },
  keysText: { fontFamily: font.strong, fontSize: 15.5, lineHeight: 20 },
});
