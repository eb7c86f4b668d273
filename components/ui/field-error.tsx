import { StyleSheet, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

/** The line under a field; the region is always there, so that a new error is read out. */
export function FieldError({ id, error }: { id: string; error: string | undefined }) {
  return (
    <View aria-live="polite">
      {error ? (
        <View style={styles.row}>
          <Icon name="octagon" size={18} color="madderInk" />
          <Txt kind="small" color="madderInk" style={styles.text} id={id}>
            {error}
          </Txt>
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: 7, marginTop: 1, alignItems: 'flex-start' },
  text: { fontFamily: font.strong, flexShrink: 1 },
});
