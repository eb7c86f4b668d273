import { StyleSheet, Text, type TextStyle, View } from 'react-native';

import { font } from '@/components/ui/type';
import { readFraction } from '@/components/ui/split-fractions';

interface BuiltFractionProps {
  over: string;
  under: string;
  mixed: boolean;
  /** px of the text it stands in */
  fontSize: number;
  color: string;
}

const SMALL = 0.64;

/** A fraction with the numerator raised, a slanted bar and the denominator on the line. */
export function BuiltFraction({ over, under, mixed, fontSize, color }: BuiltFractionProps) {
  const small: TextStyle = {
    fontFamily: font.bold,
    fontSize: fontSize * SMALL,
    lineHeight: fontSize * SMALL,
    letterSpacing: 0,
    color,
  };
  const raised: TextStyle = { ...small, position: 'relative', top: -fontSize * 0.3 };
  return (
    <View role="img" aria-label={readFraction(over, under, mixed)} style={styles.row}>
      {mixed && <Text style={styles.gap}>{'\u00a0'}</Text>}
      <Text style={raised}>{over}</Text>
      <Text style={[small, styles.bar, { fontSize, lineHeight: fontSize }]}>⁄</Text>
      <Text style={small}>{under}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'baseline' },
  // there for whoever copies or reads the text, "1 5⁄8", yet without a width to speak of
  gap: { fontSize: 1, lineHeight: 1 },
  bar: { fontFamily: font.body },
});
