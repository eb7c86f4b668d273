import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { neighbours } from '@/components/station/next-step';
import { countItem } from '@/components/steps/item-words';
import { cautionText, mistakeText, stepTitle, stepWhy } from '@/components/steps/messages';
import { pieceSizes } from '@/components/steps/piece-sizes';
import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { Sheet } from '@/components/ui/sheet';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';
import type { Progress, StepProgress } from '@/shared/model/tally';

interface AboutSheetProps {
  plan: Plan;
  step: PlanStep;
  progress: Progress;
  own: StepProgress;
  lane: PlanLane | null;
  onGo: (step: StepProgress) => void;
  onClose: () => void;
}

/** All about a step: why, what it uses and makes, what goes wrong, and every caution. */
export function AboutSheet(props: AboutSheetProps) {
  const { plan, step, progress, own, lane, onGo, onClose } = props;
  const { before, after } = neighbours(progress.steps, own);
  return (
    <Sheet open title={stepTitle(step)} onClose={onClose} testID="about-sheet">
      <Section title="Why and how">
        <Txt>{stepWhy(step, plan)}</Txt>
      </Section>
      {lane ? <Flow plan={plan} lane={lane} /> : null}
      {step.mistakes.length > 0 ? (
        <Section title="What goes wrong, and how to see it">
          {step.mistakes.map((code) => (
            <Txt key={code}>{mistakeText(code)}</Txt>
          ))}
        </Section>
      ) : null}
      {step.cautions.length > 0 ? (
        <Section title="Cautions">
          {step.cautions.map((code) => (
            <View key={code} style={styles.caution}>
              <Icon name="triangle" size={20} color="weldInk" />
              <Txt style={styles.grow}>{cautionText(code)}</Txt>
            </View>
          ))}
        </Section>
      ) : null}
      <View style={styles.ways}>
        {before ? <StepButton label="Step before" step={before} onGo={onGo} /> : null}
        {after ? <StepButton label="Step after" step={after} onGo={onGo} /> : null}
      </View>
    </Sheet>
  );
}

function StepButton(props: {
  label: string;
  step: StepProgress;
  onGo: (step: StepProgress) => void;
}) {
  const { label, step, onGo } = props;
  return (
    <Button
      label={`${label} here`}
      kind="second"
      onPress={() => onGo(step)}
      testID={`go-${step.role}`}
      style={styles.way}
    />
  );
}

/** What one tap uses and makes, each with its cut and finished size. */
function Flow({ plan, lane }: { plan: Plan; lane: PlanLane }) {
  const used = Object.keys(lane.consumes);
  return (
    <>
      {used.length > 0 ? (
        <Section title="Uses">
          {used.map((item) => (
            <ItemLine key={item} plan={plan} item={item} amount={lane.consumes[item] ?? 1} />
          ))}
        </Section>
      ) : null}
      <Section title="Makes">
        {Object.entries(lane.makes).map(([item, count]) => (
          <ItemLine key={item} plan={plan} item={item} amount={count} />
        ))}
      </Section>
    </>
  );
}

function ItemLine(props: { plan: Plan; item: string; amount: number | string }) {
  const { plan, item, amount } = props;
  const { cut, finished } = pieceSizes(item, plan);
  const name =
    typeof amount === 'number'
      ? countItem(item, amount)
      : `${fractionWords(amount)} of ${countItem(item, 1)}`;
  return (
    <View>
      <Txt style={styles.strong}>{name}</Txt>
      {cut ? <Txt kind="small" color="ink2">{`Cut ${cut}`}</Txt> : null}
      {finished ? <Txt kind="small" color="ink2">{`Finished ${finished}`}</Txt> : null}
    </View>
  );
}

/** "1⁄5" of a strip: a part of a thing, as the plan shares it out. */
function fractionWords(part: string): string {
  return part.replace('/', '⁄');
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <View style={styles.section}>
      <Txt kind="label" color="ink2" heading={3}>
        {title}
      </Txt>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 8, marginTop: 18 },
  caution: { flexDirection: 'row', gap: 10 },
  grow: { flex: 1 },
  strong: { fontFamily: font.bold },
  ways: { flexDirection: 'row', flexWrap: 'wrap', gap: 8, marginTop: 24 },
  way: { flexGrow: 1 },
});
