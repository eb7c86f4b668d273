import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { addFabric, letterFabrics, listFabrics } from '@/components/plan/draft-fabrics';
import { FabricRow } from '@/components/plan/fabric-row';
import { FabricSheet } from '@/components/plan/fabric-sheet';
import type { FieldName } from '@/components/plan/field-names';
import type { Setup } from '@/components/plan/use-setup';
import { Button } from '@/components/ui/button';
import { FieldError } from '@/components/ui/field-error';
import { space } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

/** The cloths: the wedges' in their order round the ring, then the background and the circle's. */
export function FabricFields({ setup }: { setup: Setup }) {
  const [opened, setOpened] = useState<string | null>(null);
  const { draft, errors, change } = setup;
  const fabrics = letterFabrics(draft);
  const ids = listFabrics(draft).map(({ id }) => id);
  const wedges = draft.wedgeFabrics.length;
  const row = (at: number) => {
    const fabric = fabrics[at];
    const id = ids[at];
    if (!fabric || id === undefined) return null;
    return (
      <FabricRow
        key={id}
        setup={setup}
        id={id}
        fabric={fabric}
        error={errors[`fabric:${at}` satisfies FieldName]}
        onOpen={() => setOpened(id)}
        testID={at === 0 ? 'fabrics' : `fabric:${at}`}
      />
    );
  };
  return (
    <View style={styles.fields}>
      <Txt kind="section" heading={2}>
        Wedge fabrics
      </Txt>
      <View role="list">{fabrics.slice(0, wedges).map((_, at) => row(at))}</View>
      <FieldError id="fabrics-error" error={errors.fabrics} />
      <Button
        label="Add a fabric"
        icon="plus"
        kind="second"
        onPress={() => change(addFabric)}
        style={styles.add}
        testID="add-fabric"
      />
      <Txt kind="section" heading={2} style={styles.next}>
        Background
      </Txt>
      <View role="list">{row(wedges)}</View>
      {fabrics.length > wedges + 1 ? (
        <>
          <Txt kind="section" heading={2} style={styles.next}>
            Circle
          </Txt>
          <View role="list">{row(wedges + 1)}</View>
        </>
      ) : null}
      <FabricSheet setup={setup} id={opened} onClose={() => setOpened(null)} />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space[2] },
  add: { borderStyle: 'dashed' },
  next: { marginTop: space[2] },
});
