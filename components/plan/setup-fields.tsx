import { StyleSheet, View } from 'react-native';

import { FabricFields } from '@/components/plan/fabric-fields';
import { CircleFabricChoice } from '@/components/plan/circle-fabric-choice';
import { CuttingFields } from '@/components/plan/cutting-fields';
import { MoreFields } from '@/components/plan/more-fields';
import { SizeStepper } from '@/components/plan/size-stepper';
import type { Setup } from '@/components/plan/use-setup';
import { ChoiceBar } from '@/components/ui/choice-bar';
import { Field } from '@/components/ui/field';
import { FieldError } from '@/components/ui/field-error';
import { space } from '@/components/ui/theme';

const TIPS = [
  { value: 'pointed', label: 'Pointed' },
  { value: 'rounded', label: 'Rounded' },
  { value: 'flat', label: 'Flat' },
] as const;
const CENTRES = [
  { value: 'circle', label: 'Circle' },
  { value: 'none', label: 'Open hole' },
] as const;

interface SetupFieldsProps {
  setup: Setup;
  /** what the project is called when no name is typed */
  usualName: string;
  /** the cap of the blade chosen, by the maker's settings */
  settingsBladeMm: 18 | 28 | 45 | 60;
}

/** The whole form, in the order in which a maker decides. */
export function SetupFields({ setup, usualName, settingsBladeMm }: SetupFieldsProps) {
  const { draft, errors, change } = setup;
  return (
    <View style={styles.fields}>
      <Field
        label="Project name"
        value={draft.name}
        onChangeText={setup.typeName}
        onBlur={setup.leave}
        hint={draft.name.trim() === '' ? `Left empty, it is called ${usualName}` : undefined}
        maxLength={80}
        testID="name"
      />
      <View style={styles.row}>
        <SizeStepper setup={setup} field="block" label="Block size" unit="in" />
        <SizeStepper setup={setup} field="blocks" label="Blocks" />
      </View>
      <View style={styles.row}>
        <SizeStepper setup={setup} field="wedges" label="Wedges" />
        <SizeStepper setup={setup} field="usableWidth" label="Usable width" unit="in" />
      </View>
      <View>
        <ChoiceBar
          label="Tip"
          options={TIPS}
          value={draft.tip}
          onChange={(tip) => change((old) => ({ ...old, tip }))}
          testID="tip"
        />
        <FieldError id="tip-error" error={errors.tip} />
      </View>
      <View>
        <ChoiceBar
          label="Centre"
          options={CENTRES}
          value={draft.centre}
          onChange={(centre) => change((old) => ({ ...old, centre }))}
          testID="centre"
        />
        <FieldError id="centre-error" error={errors.centre} />
      </View>
      <FabricFields setup={setup} />
      {draft.centre === 'circle' ? <CircleFabricChoice setup={setup} /> : null}
      <CuttingFields setup={setup} settingsBladeMm={settingsBladeMm} />
      <MoreFields setup={setup} />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space[4] },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 10, alignItems: 'flex-start' },
});
