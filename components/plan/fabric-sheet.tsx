import { StyleSheet, View } from 'react-native';

import { ClothChoice } from '@/components/plan/cloth-choice';
import type { DraftFabric } from '@/components/plan/draft';
import {
  buyFabric,
  changeFabric,
  letterFabrics,
  listFabrics,
  putFabricBack,
  removeFabric,
} from '@/components/plan/draft-fabrics';
import type { Setup } from '@/components/plan/use-setup';
import { useToast } from '@/components/providers/toast';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Note } from '@/components/ui/note';
import { Sheet } from '@/components/ui/sheet';
import { space } from '@/components/ui/theme';
import { Toggle } from '@/components/ui/toggle';
import { formatYards } from '@/shared/units/format-fraction';

interface FabricSheetProps {
  setup: Setup;
  id: string | null;
  onClose: () => void;
}

/** One cloth opened: its name, its colour, how its print runs; changes show at once. */
export function FabricSheet({ setup, id, onClose }: FabricSheetProps) {
  const at = listFabrics(setup.draft).findIndex((candidate) => candidate.id === id);
  const letter = letterFabrics(setup.draft)[at]?.letter ?? '';
  return (
    <Sheet open={at >= 0} title={`Fabric ${letter}`} onClose={onClose} testID="fabric-sheet">
      {at >= 0 ? <FabricDetails setup={setup} at={at} onClose={onClose} /> : null}
    </Sheet>
  );
}

interface FabricDetailsProps {
  setup: Setup;
  at: number;
  onClose: () => void;
}

function FabricDetails({ setup, at, onClose }: FabricDetailsProps) {
  const { draft, change } = setup;
  const fabric = listFabrics(draft)[at];
  const lettered = letterFabrics(draft)[at];
  if (!fabric || !lettered) return null;
  const patch = (part: Parameters<typeof changeFabric>[2]) =>
    change((old) => changeFabric(old, fabric.id, part));
  return (
    <View style={styles.fields}>
      <Field
        label="Name"
        value={fabric.name}
        onChangeText={(name) => patch({ name })}
        error={setup.errors[`fabric:${at}`]}
        maxLength={60}
        testID="fabric-name"
      />
      <ClothChoice
        fabric={lettered}
        onChoose={(cloth, known) => patch(known ? cloth : { colour: cloth.colour })}
      />
      <Toggle
        label="One-way print"
        hint="Never turned, so fewer wedges a strip"
        value={fabric.oneWay}
        onChange={(oneWay) => patch({ oneWay })}
        testID="one-way"
      />
      {fabric.buyYards === undefined ? null : (
        <Note
          tone="info"
          title={`You buy ${formatYards(fabric.buyYards)}.`}
          action={{
            label: 'Buy what is needed',
            onPress: () => change((old) => buyFabric(old, lettered.letter, null)),
          }}
        />
      )}
      {lettered.role === 'wedge' ? (
        <>
          <Toggle
            label="Dominant"
            hint="In the middle of each round, toward the corners"
            value={fabric.dominant}
            onChange={(dominant) => patch({ dominant })}
            testID="dominant"
          />
          <RemoveFabric setup={setup} fabric={fabric} at={at} onClose={onClose} />
        </>
      ) : null}
    </View>
  );
}

function RemoveFabric({
  setup,
  fabric,
  at,
  onClose,
}: FabricDetailsProps & { fabric: DraftFabric }) {
  const { show } = useToast();
  const remove = () => {
    onClose();
    setup.change((draft) => removeFabric(draft, fabric.id));
    show({
      text: `${fabric.name} removed`,
      action: {
        label: 'Put back',
        onPress: () => setup.change((draft) => putFabricBack(draft, fabric, at)),
      },
    });
  };
  return (
    <Button
      label="Remove this fabric"
      icon="trash"
      kind="second"
      onPress={remove}
      testID="remove-fabric"
    />
  );
}

const styles = StyleSheet.create({ fields: { gap: space[4] } });
