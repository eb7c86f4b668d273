import { StyleSheet, View } from 'react-native';

import { type CautionGroup, SOURCES } from '@/components/safety/cautions';
import { Txt } from '@/components/ui/txt';

interface CautionListProps {
  group: CautionGroup;
  /** whether each caution names where it comes from */
  sources: boolean;
}

/** Cautions of one place, each a line of what to do. */
export function CautionList({ group, sources }: CautionListProps) {
  return (
    <View role="list" aria-label={group.title} style={styles.list}>
      {group.cautions.map(({ text, source }) => (
        <View role="listitem" key={text}>
          <Txt>{text}</Txt>
          {sources ? (
            <Txt kind="small" color="ink2">
              {SOURCES[source]}
            </Txt>
          ) : null}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ list: { gap: 10 } });
