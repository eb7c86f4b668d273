import { StyleSheet, View } from 'react-native';

import { type Action, Button } from '@/components/ui/button';

/** Buttons one under the other, the first one filled: what an empty or a broken page offers. */
export function Actions({ actions }: { actions: readonly Action[] }) {
  return (
    <View style={styles.list}>
      {actions.map((action, at) => (
        <Button key={action.label} kind={at === 0 ? 'main' : 'second'} {...action} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ list: { alignSelf: 'stretch', gap: 10 } });
