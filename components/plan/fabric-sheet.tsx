import { StyleSheet, View } from 'react-native';

import { ClothChoice } from '@/components/plan/cloth-choice';
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
  const { draft, change } = setup;
  const toast = useToast();
  const at = listFabrics(draft).findIndex((candidate) => candidate.id === id);
  const fabric = listFabrics(draft)[at];
  const lettered = letterFabrics(draft)[at];
  if (!fabric || !lettered) return null;
  const { letter, role } = lettered;
  const patch = (part: Parameters<typeof changeFabric>[2]) =>
    change((old) => changeFabric(old, fabric.id, part));
  const remove = () => {
    onClose();
    change((old) => removeFabric(old, fabric.id));
    toast.show({
      text: `${fabric.name || letter} removed`,
      action: {
        label: 'Put back',
        onPress: () => change((old) => putFabricBack(old, fabric, at)),
      },
    });
  };
  return (
    <Sheet open title={`Fabric ${letter}`} onClose={onClose} testID="fabric-sheet">
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
        />
        {role === 'wedge' ? (
          <Toggle
            label="Dominant"
            hint="In the middle of each round, toward the corners"
            value={fabric.dominant}
            onChange={(dominant) => patch({ dominant })}
            testID="dominant"
          />
        ) : null}
        {fabric.buyYards === undefined ? null : (
          <Note
            tone="info"
            title={`You buy ${formatYards(fabric.buyYards)}.`}
            action={{
              label: 'Buy what is needed',
              onPress: () => change((old) => buyFabric(old, letter, null)),
            }}
          />
        )}
        {role === 'wedge' ? (
          <Button
            label="Remove this fabric"
            icon="trash"
            kind="second"
            onPress={remove}
            testID="remove-fabric"
          />
        ) : null}
      </View>
    </Sheet>
  );
}

const styles = StyleSheet.create({ fields: { gap: space[4] } });
