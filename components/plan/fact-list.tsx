import { StyleSheet, View } from 'react-native';

import type { Fact } from '@/components/plan/plan-facts';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

/** Names and their figures, the figures at the right. */
export function FactList({ facts }: { facts: readonly Fact[] }) {
  return (
    <View role="list">
      {facts.map(({ label, value }) => (
        <View role="listitem" key={label} style={styles.fact}>
          <Txt kind="small" color="ink2">
            {label}
          </Txt>
          <Txt kind="small" align="right" style={styles.value}>
            {value}
          </Txt>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  fact: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    columnGap: 12,
    paddingVertical: 3,
  },
  value: { fontFamily: font.bold, flexShrink: 1, marginLeft: 'auto' },
});
