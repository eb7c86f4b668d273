import { Pressable, StyleSheet, View } from 'react-native';

import { CLOTH_COLOURS, type PaletteCloth } from '@/components/plan/fabric-palette';
import { Swatch } from '@/components/ui/swatch';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressedBySpace } from '@/components/ui/web-only';
import type { RequestFabric } from '@/shared/model/plan-request';

interface ClothChoiceProps {
  fabric: RequestFabric;
  /** `known`: its name is still one of ours, so it takes the new cloth's name too */
  onChoose: (cloth: PaletteCloth, known: boolean) => void;
}

/** The colour nearest to the maker's own cloth, each with its name. */
export function ClothChoice({ fabric, onChoose }: ClothChoiceProps) {
  const { color } = useTheme();
  const known = CLOTH_COLOURS.some(({ name }) => name === fabric.name);
  return (
    <View style={styles.field}>
      <Txt kind="small" color="ink2" style={styles.label}>
        Colour
      </Txt>
      <View role="radiogroup" aria-label="Colour" style={styles.row}>
        {CLOTH_COLOURS.map((cloth) => {
          const chosen = cloth.colour === fabric.colour;
          return (
            <Pressable
              key={cloth.colour}
              {...pressedBySpace(() => onChoose(cloth, known))}
              role="radio"
              aria-checked={chosen}
              aria-label={cloth.name}
              onPress={() => onChoose(cloth, known)}
              style={[styles.choice, { borderColor: chosen ? color.ink : 'transparent' }]}
            >
              <Swatch fabric={{ ...fabric, colour: cloth.colour }} size={44} />
            </Pressable>
          );
        })}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: 5 },
  label: { fontFamily: font.strong },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2] },
  choice: { padding: 2, borderWidth: border.zone, borderRadius: radius.control },
});
