import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { Announcement } from '@/components/ui/announcement';
import { darken } from '@/components/ui/darken';
import { Icon } from '@/components/ui/icon';
import { MatGrid } from '@/components/ui/mat-grid';
import { RulerBar } from '@/components/ui/ruler-bar';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { TallyNumber } from '@/components/ui/tally-number';
import { TallyTop } from '@/components/ui/tally-top';
import { border, radius, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { useZonePress } from '@/components/ui/use-zone-press';
import { pressable } from '@/components/ui/web-only';
import type { Station } from '@/shared/model/codes';

export interface TallyZoneProps {
  station: Station;
  shown: number;
  target: number;
  perTap: number;
  /** "of 100 pieces cut" */
  caption: string;
  /** "Enough on hand for 7 more" */
  note?: string | undefined;
  /** everything is counted: the zone turns to its tint, with a check */
  full?: boolean | undefined;
  locked?: boolean | undefined;
  /** "40 of 100 pieces cut. Tap adds 5." */
  label: string;
  /** a press that was let go; always after `onPressIn` */
  onTap: () => void;
  onLongPress: () => void;
  onUnlock?: (() => void) | undefined;
  onPressIn?: (() => void) | undefined;
  onPressOut?: (() => void) | undefined;
  ruler: { tick: number; longTick?: number };
  minHeight?: number | undefined;
  testID?: string | undefined;
}

/** The big place to hit: the whole zone is one button, and nothing inside can be tapped alone. */
export function TallyZone(props: TallyZoneProps) {
  const { station, shown, target, caption, full = false, locked = false, testID = 'tally' } = props;
  const dye = useTheme().station(station);
  const [box, setBox] = useState({ width: 0, height: 0 });
  const name = locked ? 'Locked. Hold to unlock' : props.label;
  const quiet = full || locked; // words on a half transparent zone would be too faint to read
  const fill = quiet ? dye.tint : dye.fill;
  const ink = quiet ? dye.ink : dye.onFill;
  return (
    <View style={styles.place}>
      <Pressable
        {...pressable}
        {...useZonePress(props, locked, box)}
        role="button"
        {...deviceName(name)}
        testID={testID}
        onLayout={({ nativeEvent: { layout } }) => setBox(layout)}
        style={({ pressed }) => [
          styles.zone,
          { minHeight: props.minHeight ?? 0, borderColor: dye.ink },
          { backgroundColor: pressed && !locked ? darken(fill) : fill },
        ]}
      >
        <Spoken>{name}</Spoken>
        <MatGrid color={ink} />
        <TallyTop {...props} full={quiet} locked={locked} />
        <View style={styles.middle} aria-hidden>
          <TallyNumber value={shown} color={ink} width={box.width} height={box.height} />
          <View style={styles.caption}>
            {full && <Icon name="check" size={26} color={ink} stroke={3} />}
            <Txt color={ink} align="center" style={styles.of}>
              {caption}
            </Txt>
          </View>
          {props.note ? (
            <Txt color={ink} align="center" style={styles.note}>
              {props.note}
            </Txt>
          ) : null}
        </View>
        <View style={styles.ruler}>
          <RulerBar
            value={shown}
            of={target}
            {...props.ruler}
            station={station}
            onFill={!quiet}
            silent
          />
        </View>
      </Pressable>
      <Announcement text={`${shown} ${caption}`} />
    </View>
  );
}

const styles = StyleSheet.create({
  place: { flexGrow: 1 },
  zone: {
    flexGrow: 1,
    borderRadius: radius.tally,
    borderWidth: border.zone,
    overflow: 'hidden',
    userSelect: 'none',
  },
  middle: { flexGrow: 1, justifyContent: 'center', paddingHorizontal: 12, paddingVertical: 6 },
  caption: { flexDirection: 'row', justifyContent: 'center', alignItems: 'center', gap: 8 },
  of: { fontFamily: font.strong, fontSize: 23, lineHeight: 28 },
  note: { fontFamily: font.strong, marginTop: 2 },
  ruler: { paddingHorizontal: 20, paddingBottom: 14 },
});
