import { StyleSheet, View } from 'react-native';

import { type Action, Button } from '@/components/ui/button';
import type { ColorRole } from '@/components/ui/colors';
import { Icon, type IconName } from '@/components/ui/icon';
import { radius, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

export type Tone = 'info' | 'done' | 'caution' | 'error';

export const TONES: Record<Tone, { fill: ColorRole; ink: ColorRole; icon: IconName }> = {
  info: { fill: 'woadTint', ink: 'woadInk', icon: 'info' },
  done: { fill: 'mossTint', ink: 'mossInk', icon: 'done' },
  caution: { fill: 'weldTint', ink: 'weldInk', icon: 'triangle' },
  error: { fill: 'madderTint', ink: 'madderInk', icon: 'octagon' },
};

interface NoteProps {
  tone: Tone;
  title: string;
  text?: string | undefined;
  icon?: IconName | undefined;
  action?: Action | undefined;
  /** read out when it appears */
  live?: boolean | undefined;
  testID?: string | undefined;
}

/** A glyph, bold first words and at most one button. */
export function Note({ tone, title, text, icon, action, live = false, testID }: NoteProps) {
  const { color } = useTheme();
  const look = TONES[tone];
  return (
    <View
      {...(live && { role: tone === 'error' ? ('alert' as const) : ('status' as const) })}
      {...(testID && { testID })}
      style={[styles.note, { backgroundColor: color[look.fill] }]}
    >
      <Icon name={icon ?? look.icon} color={look.ink} />
      <View style={styles.words}>
        <Txt style={styles.text}>
          <Txt style={[styles.text, styles.title]}>{title}</Txt>
          {text ? ` ${text}` : ''}
        </Txt>
      </View>
      {action && <Button kind="second" small {...action} />}
    </View>
  );
}

const styles = StyleSheet.create({
  note: {
    borderRadius: radius.control,
    minHeight: 46,
    paddingHorizontal: 14,
    paddingVertical: 10,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: 12,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 180 },
  text: { fontSize: 15.5, lineHeight: 20.5 },
  title: { fontFamily: font.bold },
});
