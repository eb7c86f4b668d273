import { useState } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { useToastOffset } from '@/components/providers/toast';
import { PlacesRail } from '@/components/shell/places-nav';
import {
  CountControls,
  Drawing,
  Instruction,
  Row,
  type StationPartsProps,
  stepText,
  Switcher,
  Tally,
} from '@/components/station/station-parts';
import { BackButton } from '@/components/station/station-tools';
import { StepList } from '@/components/station/step-list';
import { WideTools } from '@/components/station/wide-tools';
import { border, pageEdge, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { useLayout } from '@/components/ui/use-layout';

const STEPS_PX = 316;
const BOTTOM_PX = 24;
const TALLY_PX = 340;
const LEAST_DIAGRAM_PX = 96;
const MOST_STACKED_PX = 220;
/** Top row, instruction, chips and row of a desk page, which the diagram leaves room for. */
const AROUND_DIAGRAM_PX = 370;
/** The same, with the controls, where the tally stands below. */
const AROUND_STACKED_PX = 376;

interface WideStationProps extends StationPartsProps {
  /** room for the diagram beside the tally */
  desk: boolean;
}

/** From 900 px: all steps at the side, the current one beside them. */
export function WideStation({ desk, ...props }: WideStationProps) {
  const { color } = useTheme();
  const { height } = useLayout();
  const [countingPx, setCountingPx] = useState(0);
  useToastOffset(desk ? 0 : countingPx + BOTTOM_PX);
  const leastZone = height * size.tallyMinShare;
  const left = height - (desk ? AROUND_DIAGRAM_PX : AROUND_STACKED_PX + leastZone);
  const diagram = Math.max(LEAST_DIAGRAM_PX, desk ? left : Math.min(MOST_STACKED_PX, left));
  return (
    <View style={[styles.page, { backgroundColor: color.paper }]}>
      <PlacesRail here="projects" />
      <AllSteps {...props} />
      <View role="main" style={styles.work}>
        <View style={styles.top}>
          <View style={styles.switcher}>
            <Switcher {...props} />
          </View>
          <WideTools tools={props.tools} chip={desk} />
        </View>
        <View
          style={[
            desk ? styles.beside : styles.stacked,
            desk && props.leftHanded && styles.mirrored,
          ]}
        >
          <ScrollView style={desk ? styles.grow : styles.shrink}>
            <Instruction {...props} />
            <Drawing {...props} height={diagram} />
            <Row {...props} />
          </ScrollView>
          <View
            style={[styles.counting, desk ? { width: TALLY_PX } : styles.fixed]}
            onLayout={({ nativeEvent }) => setCountingPx(nativeEvent.layout.height)}
          >
            <Tally {...props} minHeight={leastZone} />
            <CountControls {...props} />
          </View>
        </View>
      </View>
    </View>
  );
}

function AllSteps(props: StationPartsProps) {
  const { color } = useTheme();
  const { reading, progress, onGo } = props;
  return (
    <ScrollView
      role="complementary"
      aria-label="Steps of the project"
      style={[styles.list, { borderColor: color.line }]}
    >
      <View style={styles.listHead}>
        <BackButton projectId={reading.project.id} />
        <View style={styles.listWords}>
          <Txt kind="section" heading={2} style={styles.project}>
            {reading.project.name}
          </Txt>
          <Txt kind="small" color="ink2">
            {stepText(props)}
          </Txt>
        </View>
      </View>
      <StepList
        steps={reading.plan.steps}
        progress={progress.steps}
        currentKey={reading.step.key}
        onGo={onGo}
      />
    </ScrollView>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, flexDirection: 'row' },
  list: { width: STEPS_PX, flexGrow: 0, flexShrink: 0, borderRightWidth: border.hair },
  listHead: { flexDirection: 'row', paddingVertical: 16, paddingLeft: 6, paddingRight: 16, gap: 4 },
  listWords: { flex: 1, minWidth: 0, gap: 4, paddingTop: 8 },
  project: { fontSize: 26, lineHeight: 31 },
  work: {
    flex: 1,
    minWidth: 0,
    paddingLeft: pageEdge.wide,
    paddingRight: 18,
    paddingTop: 16,
    paddingBottom: BOTTOM_PX,
    gap: 12,
  },
  top: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: 12 },
  switcher: { flexGrow: 1, flexShrink: 1, maxWidth: 404 },
  beside: { flex: 1, flexDirection: 'row', gap: 20, minHeight: 0 },
  stacked: { flex: 1, gap: 12, minHeight: 0 },
  mirrored: { flexDirection: 'row-reverse' },
  grow: { flexGrow: 1, flexShrink: 1, flexBasis: 0 },
  shrink: { flexGrow: 0, flexShrink: 1 },
  counting: { gap: 12 },
  fixed: { flexGrow: 1, flexShrink: 0 },
});
