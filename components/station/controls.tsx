import { Pressable, StyleSheet, View } from 'react-native';

import { Icon, type IconName } from '@/components/ui/icon';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressable } from '@/components/ui/web-only';

interface ControlsProps {
  /** what − takes back, in pieces */
  back: { label: string; spoken: string };
  onUndo: () => void;
  onKeypad: () => void;
  /** Miscut at the Table, Unpick at the Machine, Lost elsewhere, with how many so far */
  loss: { word: string; count: number; icon: IconName };
  onLoss: () => void;
  locked: boolean;
  mirrored: boolean;
}

/** Take back, exact count, and what went wrong: always visible above the zone. */
export function Controls(props: ControlsProps) {
  const { back, onUndo, onKeypad, loss, onLoss, locked, mirrored } = props;
  const spokenLoss = loss.count > 0 ? `${loss.word}, ${loss.count} so far` : loss.word;
  return (
    <View style={[styles.row, mirrored && styles.mirrored]}>
      <Control
        icon="undo"
        label={back.label}
        spoken={back.spoken}
        onPress={onUndo}
        locked={locked}
        grow={0.8}
        testID="undo"
      />
      <Control
        icon="keypad"
        label="Keypad"
        spoken="Keypad: set an exact count"
        onPress={onKeypad}
        locked={locked}
        grow={1}
        testID="keypad"
      />
      <Control
        icon={loss.icon}
        label={loss.word}
        badge={loss.count}
        spoken={spokenLoss}
        onPress={onLoss}
        locked={locked}
        grow={1.16}
        testID="loss"
      />
    </View>
  );
}

interface ControlProps {
  icon: IconName;
  label: string;
  spoken: string;
  badge?: number;
  grow: number;
  locked: boolean;
  onPress: () => void;
  testID: string;
}

function Control(props: ControlProps) {
  const { icon, label, spoken, badge = 0, grow, locked, onPress, testID } = props;
  const { color } = useTheme();
  return (
    <Pressable
      {...pressable}
      role="button"
      {...(badge > 0 ? deviceName(spoken) : { 'aria-label': spoken })}
      disabled={locked}
      testID={testID}
      onPress={onPress}
      style={({ pressed }) => [
        styles.control,
        { flexGrow: grow, backgroundColor: color.card, borderColor: color.edge },
        pressed && { backgroundColor: color.sunk },
        locked && styles.locked,
      ]}
    >
      <Icon name={icon} size={21} color={color.ink} />
      <Txt style={styles.word} numberOfLines={1}>
        {label}
      </Txt>
      {badge > 0 ? (
        <View style={[styles.badge, { backgroundColor: color.sunk }]}>
          <Txt kind="label">{String(badge)}</Txt>
          <Spoken> so far</Spoken>
        </View>
      ) : null}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: 8 },
  mirrored: { flexDirection: 'row-reverse' },
  control: {
    flexBasis: 0,
    minHeight: 56,
    minWidth: 48,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 6,
    paddingHorizontal: 3,
    borderRadius: 17,
    borderWidth: 1.5,
  },
  locked: { opacity: 0.6 },
  word: { fontFamily: font.bold },
  badge: {
    minWidth: 24,
    height: 24,
    borderRadius: 12,
    alignItems: 'center',
    paddingHorizontal: 6,
    justifyContent: 'center',
  },
});
