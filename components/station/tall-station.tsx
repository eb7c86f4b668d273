import { useState } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { useToastOffset } from '@/components/providers/toast';
import {
  CountControls,
  Drawing,
  Head,
  Instruction,
  Row,
  type StationPartsProps,
  Switcher,
  Tally,
} from '@/components/station/station-parts';
import { pageEdge, size, useTheme } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';

const MOST_DIAGRAM_PX = 157;
const LEAST_DIAGRAM_PX = 96;
/** Header, switcher, row and controls with what is between them. */
const AROUND_PX = 240;

/** A phone held upright: the diagram gives up height first, the zone never goes under 40 %. */
export function TallStation(props: StationPartsProps) {
  const { color } = useTheme();
  const { height } = useLayout();
  const { top, bottom } = useSafeAreaInsets();
  const [wordsPx, setWordsPx] = useState(100);
  const [countingPx, setCountingPx] = useState(height * size.tallyMinShare);
  useToastOffset(countingPx);
  const leastZone = height * size.tallyMinShare;
  const left = height - leastZone - AROUND_PX - wordsPx - top - bottom;
  const diagram = Math.max(LEAST_DIAGRAM_PX, Math.min(MOST_DIAGRAM_PX, left));
  return (
    <View
      role="main"
      style={[
        styles.page,
        { backgroundColor: color.paper, paddingTop: top, paddingBottom: bottom },
      ]}
    >
      <Head {...props} />
      <View style={styles.edge}>
        <Switcher {...props} />
      </View>
      <ScrollView style={styles.reading} contentContainerStyle={styles.edge}>
        <View onLayout={({ nativeEvent }) => setWordsPx(nativeEvent.layout.height)}>
          <Instruction {...props} />
        </View>
        <Drawing {...props} height={diagram} />
        <Row {...props} />
      </ScrollView>
      <View
        style={styles.counting}
        onLayout={({ nativeEvent }) => setCountingPx(nativeEvent.layout.height)}
      >
        <View style={styles.edge}>
          <CountControls {...props} />
        </View>
        <View style={[styles.zone, { minHeight: leastZone + ZONE_EDGES_PX }]}>
          <Tally {...props} minHeight={leastZone} />
        </View>
      </View>
    </View>
  );
}

const ZONE_EDGES_PX = 13;
const styles = StyleSheet.create({
  page: { flex: 1 },
  edge: { paddingHorizontal: pageEdge.phone },
  reading: { flexGrow: 0, flexShrink: 1 },
  counting: { flexGrow: 1, flexShrink: 0 },
  zone: { flexGrow: 1, paddingHorizontal: 6, paddingTop: 7, paddingBottom: 6 },
});
