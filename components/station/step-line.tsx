import { Pressable, StyleSheet, View } from 'react-native';

import { enoughText, outrunText } from '@/components/station/enough-text';
import { nextStep } from '@/components/station/next-step';
import { cautionText, stepTitle, unitWord } from '@/components/steps/messages';
import { Icon, type IconName } from '@/components/ui/icon';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { useTextScale } from '@/components/ui/use-text-scale';
import { pressable } from '@/components/ui/web-only';
import type { PlanStep } from '@/shared/model/plan';
import type { Progress, StepProgress } from '@/shared/model/tally';

/** From here on a line would be too short to say which step is next. */
const LARGE_TEXT = 1.3;

interface StepLineProps {
  step: PlanStep;
  steps: readonly PlanStep[];
  progress: Progress;
  own: StepProgress;
  onGo: (step: StepProgress) => void;
}

/** One row above the controls: what does not add up, else what comes next, else a caution. */
export function StepLine({ step, steps, progress, own, onGo }: StepLineProps) {
  const outrun = outrunText(own, step);
  if (outrun) return <Line icon="triangle" color="weldInk" text={outrun} live />;
  const next = nextStep(steps, progress.steps, own);
  const nextPlan = steps.find(({ key }) => key === next?.key);
  const goesOn =
    next !== null && (own.toGo === 0 || (step.station === 'machine' && next.ready > 0));
  if (goesOn && nextPlan) {
    const count = next.ready > 0 ? ` (${next.ready} ${unitWord(next.role, next.ready)})` : '';
    return (
      <NextLine
        text={`${stepTitle(nextPlan)}${count}`}
        icon={nextPlan.station}
        onPress={() => onGo(next)}
      />
    );
  }
  const [caution] = step.cautions;
  if (caution) return <Line icon="triangle" color="weldInk" text={cautionText(caution)} />;
  const enough = enoughText(own, null);
  return enough ? <Line icon="info" color="ink2" text={enough} /> : null;
}

function Line(props: { icon: IconName; color: string; text: string; live?: boolean }) {
  const { icon, color, text, live = false } = props;
  return (
    <View style={styles.line} testID="step-line">
      <Icon name={icon} size={18} color={color} />
      <Txt kind="small" style={styles.text} live={live ? 'polite' : undefined}>
        {text}
      </Txt>
    </View>
  );
}

function NextLine(props: { icon: IconName; text: string; onPress: () => void }) {
  const { icon, text, onPress } = props;
  const { color } = useTheme();
  const large = useTextScale() > LARGE_TEXT;
  return (
    <Pressable
      {...pressable}
      role="button"
      aria-label={`Next: ${text}`}
      testID="next-step"
      onPress={onPress}
      style={[styles.line, styles.next]}
    >
      <Icon name={icon} size={20} color={color.ink} />
      <Txt kind="small" style={styles.strong}>
        Next:
      </Txt>
      <Txt kind="small" numberOfLines={large ? undefined : 1} style={styles.text}>
        {text}
      </Txt>
      <Icon name="chevron" size={20} color={color.ink2} />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    paddingHorizontal: 6,
    paddingVertical: 4,
  },
  next: { minHeight: 48, paddingVertical: 0 },
  text: { flexShrink: 1, flexGrow: 1 },
  strong: { fontFamily: font.bold },
});
