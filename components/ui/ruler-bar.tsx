import { StyleSheet, View } from 'react-native';

import { rulerMarks } from '@/components/ui/ruler-marks';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { useTextScale } from '@/components/ui/use-text-scale';
import type { Station } from '@/shared/model/codes';

interface RulerBarProps {
  value: number;
  of: number;
  /** units between short ticks: one a cut */
  tick: number;
  /** units between long, numbered ticks: one a stack */
  longTick?: number | undefined;
  station?: Station | undefined;
  /** it stands on the station's own fill, not on paper */
  onFill?: boolean | undefined;
  /** no name of its own: what it stands in says the number */
  silent?: boolean | undefined;
}

/** Progress as a ruler: a tick a cut, a long tick a stack, numbers under it. */
export function RulerBar(props: RulerBarProps) {
  const { value, of, tick, longTick, station = 'table', onFill = false, silent = false } = props;
  const theme = useTheme();
  const scale = useTextScale();
  const dye = theme.station(station);
  const ink = onFill ? dye.onFill : dye.ink;
  const share = of > 0 ? Math.min(1, Math.max(0, value / of)) : 0;
  const marks = rulerMarks(of, tick, longTick, Math.floor(7 / scale));
  const named = { role: 'img' as const, 'aria-label': `${value} of ${of}` };
  return (
    <View {...(silent ? { 'aria-hidden': true } : named)}>
      <View style={[styles.bar, { borderColor: ink }]}>
        <View style={[styles.fill, { width: `${share * 100}%`, backgroundColor: ink }]} />
        {marks
          .filter(({ at }) => at > value && at < of)
          .map(({ at, long }) => (
            <View
              key={at}
              style={[
                styles.tick,
                long && styles.long,
                { left: `${(at / of) * 100}%`, backgroundColor: ink },
              ]}
            />
          ))}
      </View>
      <View style={[styles.numbers, { minHeight: 20 * scale }]} aria-hidden>
        {marks.map(({ at, label }) =>
          label === null ? null : (
            <View key={at} style={[styles.number, numberPlace(at / of)]}>
              <Txt kind="label" color={ink}>
                {label}
              </Txt>
            </View>
          ),
        )}
      </View>
    </View>
  );
}

/** The ends stay inside the bar; the others stand centred under their tick. */
function numberPlace(share: number) {
  if (share === 0) return { left: 0, alignItems: 'flex-start' as const };
  if (share === 1) return { right: 0, alignItems: 'flex-end' as const };
  return { left: `${share * 100}%` as const, marginLeft: -30, alignItems: 'center' as const };
}

const styles = StyleSheet.create({
  bar: { height: 15.5, borderRadius: 4, borderWidth: 1.5, overflow: 'hidden' },
  fill: { height: '100%' },
  tick: { position: 'absolute', bottom: 0, height: 6, width: 1.25, marginLeft: -0.6 },
  long: { height: '100%', width: 1.5, marginLeft: -0.75 },
  numbers: { marginTop: 4 },
  number: { position: 'absolute', width: 60 },
});
