import { StyleSheet, View } from 'react-native';

import { useExample } from '@/components/projects/use-example';
import { Button } from '@/components/ui/button';
import { Txt } from '@/components/ui/txt';

/** Says quietly that the projects shown are an example, and takes them away in one tap. */
export function ExampleRow() {
  const { takeAway } = useExample();
  return (
    <View style={styles.row} testID="example-row">
      <Txt color="ink2">These are an example</Txt>
      <Button
        label="Take it away"
        kind="quiet"
        small
        onPress={() => void takeAway()}
        testID="take-example-away"
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    paddingHorizontal: 8,
  },
});
