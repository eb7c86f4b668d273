import { StyleSheet, Text, View } from 'react-native';

import { font, numerals } from '@/components/ui/type';
import { useLayout } from '@/components/ui/use-layout';
import { useTextScale } from '@/components/ui/use-text-scale';
import { webOnly } from '@/components/ui/web-only';

const LINE = 0.78;
const TRACKING = -0.035;
const SMALLEST_PX = 96;
/** width of a numeral as a share of its size, tracking included */
const NUMERAL_WIDTH = 0.6;

/**
 * Size of the tally's numeral in px: 168 (212 wide), 140 with three digits, 104 with four, less
 * where the zone is small, and 96 at least.
 */
export function tallySize(digits: number, wide: boolean, width: number, height: number): number {
  const wanted = digits >= 4 ? 104 : digits === 3 ? 140 : wide ? 212 : 168;
  if (width === 0 || height === 0) return wanted;
  const fitting = Math.min(wanted, (width * 0.9) / (digits * NUMERAL_WIDTH), height * 0.5);
  return Math.max(SMALLEST_PX, Math.floor(fitting));
}

interface TallyNumberProps {
  value: number;
  color: string;
  /** px of the zone it stands in; 0 before it is known */
  width: number;
  height: number;
}

/** The number of the tally. Each new one fades up 6 px (public/app.css), unless motion is off. */
export function TallyNumber({ value, color, width, height }: TallyNumberProps) {
  const { kind } = useLayout();
  const scale = useTextScale(); // larger words leave less height for the numeral
  const wide = kind === 'wide' || kind === 'desk';
  const fontSize = tallySize(String(value).length, wide, width, height / scale);
  return (
    <View style={styles.place} testID="tally-number">
      <Text
        key={value}
        {...webOnly({ dataSet: { count: 'new' } })}
        style={[
          styles.number,
          numerals,
          { color, fontSize, lineHeight: fontSize * LINE, letterSpacing: fontSize * TRACKING },
        ]}
      >
        {value}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  place: { alignItems: 'center', marginBottom: 14 },
  number: { fontFamily: font.bold, textAlign: 'center' },
});
