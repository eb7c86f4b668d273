import { StyleSheet, View } from 'react-native';

import { EmptyRing } from '@/components/diagrams/empty-ring';
import { Actions } from '@/components/ui/actions';
import type { Action } from '@/components/ui/button';
import { Txt } from '@/components/ui/txt';

interface EmptyStateProps {
  title: string;
  text: string;
  actions: readonly Action[];
}

/** Nothing here yet: a dashed ring, one sentence, one main button. */
export function EmptyState({ title, text, actions }: EmptyStateProps) {
  return (
    <View style={styles.page}>
      <EmptyRing size={236} />
      <Txt kind="section" heading={2} align="center" style={styles.title}>
        {title}
      </Txt>
      <Txt align="center" style={styles.text}>
        {text}
      </Txt>
      <Actions actions={actions} />
    </View>
  );
}

const styles = StyleSheet.create({
  page: {
    alignItems: 'center',
    alignSelf: 'center',
    width: '100%',
    maxWidth: 420,
    paddingHorizontal: 28,
    paddingVertical: 18,
  },
  title: { fontSize: 26, lineHeight: 31, marginTop: 26 },
  text: { fontSize: 17, lineHeight: 23, marginTop: 10, marginBottom: 26 },
});
