import { StyleSheet, View } from 'react-native';

import { ALWAYS_TYPED, type SizeField } from '@/components/plan/field-names';
import { stepSize, writeSize } from '@/components/plan/field-texts';
import type { Setup } from '@/components/plan/use-setup';
import { Button } from '@/components/ui/button';
import { Stepper } from '@/components/ui/stepper';
import { Txt } from '@/components/ui/txt';

interface SizeStepperProps {
  setup: Setup;
  field: SizeField;
  label: string;
  unit?: string;
  hint?: string;
}

/** Layers that are left to the plan are stepped from what the plan came to. */
function deepest({ good }: Setup): string {
  return String(Math.max(1, ...(good?.plan.stacks ?? []).map(({ perCut }) => perCut)));
}

/** One size of the form: typed or stepped, with the way back to the default it would follow. */
export function SizeStepper({ setup, field, label, unit, hint }: SizeStepperProps) {
  const text = setup.shownText(field);
  const lastGood = setup.good ? writeSize(field, setup.good.request) || deepest(setup) : '';
  const stepped = (by: 1 | -1) => stepSize(field, text, by) ?? stepSize(field, lastGood, by);
  const step = (by: 1 | -1) => {
    const next = stepped(by);
    if (next === null) return;
    setup.change((draft) => ({ ...draft, texts: { ...draft.texts, [field]: next } }));
  };
  const follow = () =>
    setup.change((draft) => {
      const { [field]: _, ...texts } = draft.texts;
      return { ...draft, texts };
    });
  const own = setup.draft.texts[field] !== undefined && !ALWAYS_TYPED.includes(field);
  return (
    <View style={styles.field}>
      <Stepper
        label={label}
        value={text}
        unit={unit}
        error={setup.errors[field]}
        onChangeText={(typed) => setup.type(field, typed)}
        onStep={step}
        onBlur={setup.leave}
        canLess={stepped(-1) !== null}
        canMore={stepped(1) !== null}
        testID={field}
      />
      {hint ? (
        <Txt kind="small" color="ink2">
          {hint}
        </Txt>
      ) : null}
      {own ? (
        <Button
          label="Back to the default"
          accessibilityLabel={`Back to the default, ${label}`}
          kind="quiet"
          small
          icon="undo"
          onPress={follow}
          style={styles.back}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  field: { flexGrow: 1, flexShrink: 1, flexBasis: 150, minWidth: 0 },
  back: { alignSelf: 'flex-start', paddingHorizontal: 4 },
});
