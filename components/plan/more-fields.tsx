import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { MORE_FIELDS } from '@/components/plan/field-names';
import { writeLength } from '@/components/plan/plan-facts';
import { SizeStepper } from '@/components/plan/size-stepper';
import type { Setup } from '@/components/plan/use-setup';
import { Button } from '@/components/ui/button';
import { space } from '@/components/ui/theme';

/** The sizes that follow by themselves; open when one of them is wrong. */
export function MoreFields({ setup }: { setup: Setup }) {
  const [wanted, setWanted] = useState(false);
  const wrong = MORE_FIELDS.some((field) => setup.errors[field] !== undefined);
  const open = wanted || wrong;
  const margin = setup.good && writeLength(setup.good.plan.geometry.ring.margin);
  return (
    <View style={styles.fields}>
      <Button
        label={open ? 'Fewer sizes' : 'More sizes'}
        icon={open ? 'minus' : 'plus'}
        kind="second"
        expands={{ id: 'more-sizes', open }}
        onPress={() => setWanted(!open)}
        testID="more"
      />
      {open ? (
        <View id="more-sizes" style={styles.row}>
          <SizeStepper
            setup={setup}
            field="stripHeight"
            label="Strip height"
            unit="in"
            {...(margin && { hint: `Leaves a margin of ${margin}` })}
          />
          <SizeStepper
            setup={setup}
            field="narrowAt"
            label="Narrow edge at"
            unit="in"
            hint="From the plate's centre, raw"
          />
          <SizeStepper setup={setup} field="seam" label="Seam" unit="in" />
          {setup.draft.centre === 'circle' ? (
            <SizeStepper setup={setup} field="overlap" label="Circle overlap" unit="in" />
          ) : null}
          <SizeStepper
            setup={setup}
            field="trimAllowance"
            label="Trim allowance"
            unit="in"
            hint="Background cut larger by this"
          />
          <SizeStepper setup={setup} field="shrinkPercent" label="Shrinkage" unit="%" />
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space[4] },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: 12, alignItems: 'flex-start' },
});
