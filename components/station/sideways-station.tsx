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
import { pageEdge, useTheme } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';

const DIAGRAM_SHARE = 0.38;
/** A little over the other half, so that the zone itself is half as wide as the phone. */
const COUNTING_SHARE = 1.06;
const LEAST_DIAGRAM_PX = 96;
const HEADER_PX = 52;
const EDGE_PX = 6;

/** A phone on its side: diagram on the left, tally on the right at half the width. */
export function SidewaysStation(props: StationPartsProps) {
  const { color } = useTheme();
  const { height } = useLayout();
  const insets = useSafeAreaInsets();
  useToastOffset(0);
  const edges = { paddingLeft: insets.left, paddingRight: insets.right };
  const zone = Math.max(0, height - HEADER_PX - EDGE_PX - insets.bottom);
  return (
    <View role="main" style={[styles.page, edges, { backgroundColor: color.paper }]}>
      <Head {...props} />
      <View style={[styles.columns, props.leftHanded && styles.mirrored]}>
        <View style={styles.half}>
          <ScrollView style={styles.reading} contentContainerStyle={styles.edge}>
            <Switcher {...props} />
            <Instruction {...props} />
            <Drawing {...props} height={Math.max(LEAST_DIAGRAM_PX, height * DIAGRAM_SHARE)} />
            <Row {...props} />
          </ScrollView>
          <View style={[styles.edge, styles.controls]}>
            <CountControls {...props} />
          </View>
        </View>
        <View style={[styles.half, styles.counting]}>
          <Tally {...props} minHeight={zone} />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  columns: { flex: 1, flexDirection: 'row', minHeight: 0 },
  mirrored: { flexDirection: 'row-reverse' },
  half: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
  counting: { flexGrow: COUNTING_SHARE, paddingRight: EDGE_PX, paddingBottom: EDGE_PX },
  reading: { flexGrow: 1, flexShrink: 1, flexBasis: 0 },
  controls: { paddingTop: 4, paddingBottom: EDGE_PX },
  edge: { paddingHorizontal: pageEdge.phone },
});
