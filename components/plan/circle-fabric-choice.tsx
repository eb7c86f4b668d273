import { Pressable, StyleSheet, View } from 'react-native';

import {
  chooseCircleFabric,
  findCircleLetter,
  letterFabrics,
  listFabrics,
} from '@/components/plan/draft-fabrics';
import type { Setup } from '@/components/plan/use-setup';
import { Button } from '@/components/ui/button';
import { FieldError } from '@/components/ui/field-error';
import { Swatch } from '@/components/ui/swatch';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressedBySpace } from '@/components/ui/web-only';

/** Which fabric the centre circle is cut from: one of the wedges', or a cloth of its own. */
export function CircleFabricChoice({ setup }: { setup: Setup }) {
  const { draft, change, errors } = setup;
  const { color } = useTheme();
  const fabrics = letterFabrics(draft);
  const ids = listFabrics(draft).map(({ id }) => id);
  const first = fabrics.find(({ dominant }) => dominant) ?? fabrics[0];
  const chosen = findCircleLetter(draft) ?? first?.letter;
  return (
    <View style={styles.field}>
      <Txt kind="small" color="ink2" style={styles.label}>
        Circle fabric
      </Txt>
      <View role="radiogroup" aria-label="Circle fabric" style={styles.row}>
        {fabrics.map((fabric, at) => {
          const choose = () => change((old) => chooseCircleFabric(old, ids[at] ?? null));
          return fabric.role === 'background' ? null : (
            <Pressable
              key={fabric.letter}
              {...pressedBySpace(choose)}
              role="radio"
              aria-checked={fabric.letter === chosen}
              aria-label={`${fabric.letter} ${fabric.name}`}
              onPress={choose}
              {...(at === 0 && { testID: 'circleFabric' })}
              style={[
                styles.choice,
                { borderColor: fabric.letter === chosen ? color.ink : 'transparent' },
              ]}
            >
              <Swatch fabric={fabric} size={44} />
            </Pressable>
          );
        })}
        {draft.circleCloth === null ? (
          <Button
            label="Another cloth"
            kind="second"
            small
            icon="plus"
            onPress={() => change((old) => chooseCircleFabric(old, 'own'))}
          />
        ) : null}
      </View>
      <FieldError id="circleFabric-error" error={errors.circleFabric} />
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: 5 },
  label: { fontFamily: font.strong },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2], alignItems: 'center' },
  choice: { padding: 3, borderWidth: border.zone, borderRadius: radius.control },
});
