import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { joinWords } from '@/components/station/enough-text';
import { neighbours } from '@/components/station/next-step';
import { countItem, itemKind, itemLetters } from '@/components/steps/item-words';
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
  return (
    <>
      <Items title="Uses" plan={plan} amounts={lane.consumes} />
      <Items title="Makes" plan={plan} amounts={lane.makes} />
    </>
  );
}

function Items(props: { title: string; plan: Plan; amounts: PlanLane['consumes'] }) {
  const { title, plan, amounts } = props;
  const groups = groupItems(amounts);
  if (groups.length === 0) return null;
  return (
    <Section title={title}>
      {groups.map(({ name, item }) => {
        const { cut, finished } = pieceSizes(item, plan);
        return (
          <View key={name}>
            <Txt style={styles.strong}>{name}</Txt>
            {cut ? <Txt kind="small" color="ink2">{`Cut ${cut}`}</Txt> : null}
            {finished ? <Txt kind="small" color="ink2">{`Finished ${finished}`}</Txt> : null}
          </View>
        );
      })}
    </Section>
  );
}

/** "1 wedge in each of A, B and C": pieces of one kind have one size, so they share a line. */
function groupItems(amounts: PlanLane['consumes']): { name: string; item: string }[] {
  const groups = new Map<string, string[]>();
  for (const [item, amount] of Object.entries(amounts)) {
    const group = `${amount} ${itemKind(item)}`;
    groups.set(group, [...(groups.get(group) ?? []), item]);
  }
  return [...groups.values()].map((items) => {
    const [item = ''] = items;
    const amount = amounts[item] ?? 1;
    const one = items.length === 1 ? item : itemKind(item);
    const of = items.length === 1 ? '' : ` in each of ${joinWords(items.map(itemLetters))}`;
    const count =
      typeof amount === 'number'
        ? countItem(one, amount)
        : `${fractionWords(amount)} of ${countItem(one, 1)}`;
    return { name: `${count}${of}`, item };
  });
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
