import { Pressable, StyleSheet, View } from 'react-native';

import { stepTitle, unitWord } from '@/components/steps/messages';
import { waitingText } from '@/components/station/enough-text';
import { Icon } from '@/components/ui/icon';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { StationBadge } from '@/components/ui/station-badge';
import { STATION_NAMES } from '@/components/ui/stations';
import { border, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { webOnly } from '@/components/ui/web-only';
import type { PlanStep } from '@/shared/model/plan';
import type { StepProgress } from '@/shared/model/tally';

interface StepListProps {
  steps: readonly PlanStep[];
  progress: readonly StepProgress[];
  currentKey: string;
  onGo: (step: StepProgress) => void;
}

/** Every step of the plan: what it is, how far it is, and what it waits for. */
export function StepList({ steps, progress, currentKey, onGo }: StepListProps) {
  return (
    <View role="list" aria-label="All steps">
      {progress.map((own) => {
        const step = steps.find(({ key }) => key === own.key);
        return step ? (
          <View role="listitem" key={own.key}>
            <StepRow step={step} own={own} current={own.key === currentKey} onGo={onGo} />
          </View>
        ) : null;
      })}
    </View>
  );
}

interface StepRowProps {
  step: PlanStep;
  own: StepProgress;
  current: boolean;
  onGo: (step: StepProgress) => void;
}

function StepRow({ step, own, current, onGo }: StepRowProps) {
  const theme = useTheme();
  const dye = theme.station(step.station);
  const { text, sign, color } = stateOf(step, own);
  const paint = current
    ? { backgroundColor: dye.tint, borderLeftColor: dye.fill }
    : { borderLeftColor: 'transparent' };
  return (
    <Pressable
      {...webOnly({ 'aria-current': current ? 'step' : undefined, dataSet: { ring: 'inside' } })}
      role="button"
      {...deviceName(`${STATION_NAMES[step.station]}: ${stepTitle(step)}. ${text}`)}
      testID={`step-${step.role}`}
      onPress={() => onGo(own)}
      style={[styles.row, { borderBottomColor: theme.color.line }, paint]}
    >
      <Spoken>{`${STATION_NAMES[step.station]}:`}</Spoken>
      <StationBadge station={step.station} size={32} ready={current} />
      <View style={styles.words}>
        <Txt kind="small" style={current ? styles.strong : styles.title}>
          {stepTitle(step)}
        </Txt>
        <Txt kind="label" color="ink2">
          {text}
        </Txt>
      </View>
      {sign ? <Icon name={sign} size={19} color={color} /> : null}
    </Pressable>
  );
}

function stateOf(step: PlanStep, own: StepProgress) {
  const count = `${own.good} of ${step.target} ${unitWord(step.role, step.target)}`;
  if (own.toGo === 0) return { text: count, sign: 'check' as const, color: 'mossInk' as const };
  if (own.ready === 0) {
    return { text: waitingText(own), sign: 'hourglass' as const, color: 'ink2' as const };
  }
  return { text: count, sign: null, color: 'ink2' as const };
}

const styles = StyleSheet.create({
  row: {
    minHeight: 60,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    paddingVertical: 8,
    paddingRight: 16,
    paddingLeft: 15,
    borderLeftWidth: 5,
    borderBottomWidth: border.hair,
  },
  words: { flex: 1, minWidth: 0 },
  title: { fontFamily: font.strong },
  strong: { fontFamily: font.bold },
});
