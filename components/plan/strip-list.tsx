import { StyleSheet, View } from 'react-native';

import { listStripLines } from '@/components/plan/strip-lines';
import { Swatch } from '@/components/ui/swatch';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Plan } from '@/shared/model/plan';

/** Which strips to cut across the width, what to cut from them, and what is left over. */
export function StripList({ plan }: { plan: Plan }) {
  const { color } = useTheme();
  return (
    <View role="list">
      {listStripLines(plan).map(({ letter, across, then, makes, left }) => {
        const fabric = plan.request.fabrics.find((candidate) => candidate.letter === letter);
        return (
          <View
            role="listitem"
            key={`${letter} ${across} ${then}`}
            style={[styles.row, { borderColor: color.line }]}
          >
            {fabric ? <Swatch fabric={fabric} size={34} /> : null}
            <View style={styles.words}>
              <Txt style={styles.across}>{across}</Txt>
              <Txt>{`${then}, ${makes}`}</Txt>
              {left ? (
                <Txt kind="small" color="ink2">
                  {left}
                </Txt>
              ) : null}
            </View>
          </View>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    minHeight: 49,
    paddingVertical: 8,
    borderBottomWidth: 1,
  },
  words: { flex: 1, minWidth: 0 },
  across: { fontFamily: font.bold },
});
