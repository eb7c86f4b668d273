import { StyleSheet, View } from 'react-native';

import { SizeStepper } from '@/components/plan/size-stepper';
import type { Setup } from '@/components/plan/use-setup';
import { ChoiceBar } from '@/components/ui/choice-bar';
import { FieldError } from '@/components/ui/field-error';
import { space } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

type BladeMm = 18 | 28 | 45 | 60;
const BLADES = ([18, 28, 45, 60] as const).map((mm) => ({
  value: String(mm) as `${BladeMm}`,
  label: `${mm} mm`,
}));
const APPLIQUE = [
  { value: 'machine', label: 'By machine' },
  { value: 'hand', label: 'By hand' },
] as const;
const PRESS = [
  { value: 'open', label: 'Open' },
  { value: 'side', label: 'To one side' },
] as const;

interface CuttingFieldsProps {
  setup: Setup;
  settingsBladeMm: BladeMm;
}

/** How this maker works: by hand or machine, how she presses, how deep she stacks. */
export function CuttingFields({ setup, settingsBladeMm }: CuttingFieldsProps) {
  const { draft, errors, change } = setup;
  const bladeMm = draft.bladeMm ?? settingsBladeMm;
  const chooseBlade = (mm: `${BladeMm}`) => {
    const chosen = BLADES.find(({ value }) => value === mm);
    if (chosen) change((old) => ({ ...old, bladeMm: Number(chosen.value) as BladeMm }));
  };
  return (
    <View style={styles.fields}>
      <Txt kind="section" heading={2}>
        How you work
      </Txt>
      <ChoiceBar
        label="Appliqué"
        options={APPLIQUE}
        value={draft.applique}
        onChange={(applique) => change((old) => ({ ...old, applique }))}
      />
      <ChoiceBar
        label="Press the ring seams"
        options={PRESS}
        value={draft.press}
        onChange={(press) => change((old) => ({ ...old, press }))}
      />
      <View>
        <ChoiceBar
          label="Blade"
          options={BLADES}
          value={`${bladeMm}`}
          onChange={chooseBlade}
          testID="bladeMm"
        />
        <FieldError id="bladeMm-error" error={errors.bladeMm} />
      </View>
      <View style={styles.row}>
        <SizeStepper
          setup={setup}
          field="cap"
          label="Most layers"
          hint="What your blade cuts well"
        />
        <SizeStepper
          setup={setup}
          field="layers"
          label="Layers a stack"
          hint="Left empty, as many as fit"
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space[4] },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 10, alignItems: 'flex-start' },
});
