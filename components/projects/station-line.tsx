import { type Href, Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { StationBadge } from '@/components/ui/station-badge';
import { STATION_NAMES } from '@/components/ui/stations';
import { size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { useLayout } from '@/components/ui/use-layout';
import type { Station } from '@/shared/model/codes';

interface StationLineProps {
  station: Station;
  state: 'ready' | 'waiting' | 'done';
  href: Href;
  /** what the step is, shown beside the station's name on a wide screen */
  task: string;
  line: string;
  count: number;
  word: string;
  testID?: string;
}

/** A station with the number that is ready there, or why nothing is yet. */
export function StationLine(props: StationLineProps) {
  const { station, state, href, task, line, count, word, testID } = props;
  const { color, station: dyeOf } = useTheme();
  const wide = useLayout().kind !== 'phone';
  const ready = state === 'ready';
  return (
    <Link href={href} asChild>
      <Pressable
        role="link"
        {...(testID && { testID })}
        style={StyleSheet.flatten([styles.row, { borderColor: color.line }])}
      >
        <StationBadge station={station} ready={ready} />
        <View style={styles.words}>
          <Txt style={styles.name} color={dyeOf(station).ink}>
            {STATION_NAMES[station]}
            {wide ? <Txt kind="small" color="ink2">{` · ${task}`}</Txt> : ''}
          </Txt>
          <Txt color={ready ? 'ink' : 'ink2'}>{line}</Txt>
        </View>
        {ready ? (
          <Txt color="ink2" align="right">
            <Txt kind="count">{count}</Txt>
            {` ${word}`}
          </Txt>
        ) : (
          <View style={styles.not}>
            <Icon name={state === 'done' ? 'check' : 'hourglass'} color="ink2" size={20} />
            <Txt color="ink2">{state === 'done' ? 'Done' : 'Not yet'}</Txt>
          </View>
        )}
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: size.row,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    paddingHorizontal: 14,
    paddingVertical: 8,
    borderBottomWidth: 1,
  },
  words: { flex: 1, minWidth: 0 },
  name: { fontFamily: font.strong },
  not: { flexDirection: 'row', alignItems: 'center', gap: 6 },
});
