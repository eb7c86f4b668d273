import { StyleSheet, View } from 'react-native';

import { writeFlow } from '@/components/plan/step-flow';
import { madeWord, stepTitle, unitWord } from '@/components/steps/messages';
import { StationBadge } from '@/components/ui/station-badge';
import { STATION_NAMES } from '@/components/ui/stations';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Plan } from '@/shared/model/plan';

/** Every step in its order of work: where, how many, what it uses and what it makes. */
export function PlanSteps({ plan }: { plan: Plan }) {
  const { color } = useTheme();
  return (
    <View role="list">
      {plan.steps.map((step) => (
        <View role="listitem" key={step.key} style={[styles.row, { borderColor: color.line }]}>
          <StationBadge station={step.station} size={32} />
          <View style={styles.words}>
            <Txt style={styles.title}>{`${step.position}. ${stepTitle(step)}`}</Txt>
            <Txt>
              {`${STATION_NAMES[step.station]} · ${step.target} ${unitWord(step.role, step.target)} ${madeWord(step.role)}`}
            </Txt>
            <Txt kind="small" color="ink2">
              {writeFlow(step)}
            </Txt>
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: 12, paddingVertical: 10, borderBottomWidth: 1 },
  words: { flex: 1, minWidth: 0, gap: 2 },
  title: { fontFamily: font.strong },
});
