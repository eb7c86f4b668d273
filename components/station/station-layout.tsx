import { ScrollView, StyleSheet, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { PlacesRail } from '@/components/shell/places-nav';
import { StationHeader } from '@/components/station/station-header';
import {
  CountControls,
  Drawing,
  Instruction,
  Row,
  type StationPartsProps,
  Switcher,
  Tally,
} from '@/components/station/station-parts';
import { StepList } from '@/components/station/step-list';
import { WideTools } from '@/components/station/wide-tools';
import { border, pageEdge, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { useLayout } from '@/components/ui/use-layout';

const STEPS_PX = 316;
const TALLY_PX = 340;
const DIAGRAM_PX = 150;
const LEAST_DIAGRAM_PX = 96;
/** Header, switcher, tally and controls of a wide page, which the diagram leaves room for. */
const AROUND_DIAGRAM_PX = 420;

/** A station page in the arrangement that the window has room for. */
export function StationLayout(props: StationPartsProps) {
  const { kind } = useLayout();
  if (kind === 'landscape') return <Sideways {...props} />;
  return kind === 'phone' ? <Tall {...props} /> : <Wide {...props} desk={kind === 'desk'} />;
}

function Head(props: StationPartsProps) {
  const { reading, tools, progress, onOpen } = props;
  return (
    <StationHeader
      projectId={reading.project.id}
      projectName={reading.project.name}
      stepText={stepText(props)}
      tools={tools}
      onSteps={progress.steps.length > 1 ? () => onOpen('steps') : null}
    />
  );
}

export function stepText({ reading, progress }: Pick<StationPartsProps, 'reading' | 'progress'>) {
  return `Step ${reading.step.position} of ${progress.steps.length}`;
}

function Tall(props: StationPartsProps) {
  const { color } = useTheme();
  const { height } = useLayout();
  const { top, bottom } = useSafeAreaInsets();
  const diagram = Math.max(LEAST_DIAGRAM_PX, Math.min(DIAGRAM_PX, height * 0.18));
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
      <ScrollView style={styles.shrink} contentContainerStyle={[styles.edge, styles.reading]}>
        <Instruction {...props} />
        <Drawing {...props} height={diagram} />
        <Row {...props} />
      </ScrollView>
      <View style={styles.edge}>
        <CountControls {...props} />
      </View>
      <View style={styles.zone}>
        <Tally {...props} minHeight={height * size.tallyMinShare} />
      </View>
    </View>
  );
}

function Sideways(props: StationPartsProps) {
  const { color } = useTheme();
  const { height, width } = useLayout();
  const insets = useSafeAreaInsets();
  const edges = { paddingLeft: insets.left, paddingRight: insets.right };
  return (
    <View role="main" style={[styles.page, edges, { backgroundColor: color.paper }]}>
      <Head {...props} />
      <View style={[styles.columns, props.leftHanded && styles.mirrored]}>
        <ScrollView style={{ width: width / 2 }} contentContainerStyle={styles.edge}>
          <Switcher {...props} />
          <Instruction {...props} />
          <Drawing {...props} height={Math.max(LEAST_DIAGRAM_PX, height * 0.45)} />
          <Row {...props} />
        </ScrollView>
        <View style={styles.half}>
          <Tally {...props} minHeight={height * 0.5} />
          <CountControls {...props} />
        </View>
      </View>
    </View>
  );
}

function Wide({ desk, ...props }: StationPartsProps & { desk: boolean }) {
  const { color } = useTheme();
  const { height } = useLayout();
  const { reading, progress, onGo } = props;
  const tally = (
    <>
      <Tally {...props} minHeight={height * (desk ? 0.5 : size.tallyMinShare)} />
      <CountControls {...props} />
    </>
  );
  return (
    <View style={[styles.page, styles.sideBySide, { backgroundColor: color.paper }]}>
      <PlacesRail here="projects" />
      <ScrollView style={[styles.list, { borderColor: color.line }]}>
        <View style={styles.listHead}>
          <Txt kind="section" heading={2} style={styles.project}>
            {reading.project.name}
          </Txt>
          <Txt kind="small" color="ink2">
            {stepText(props)}
          </Txt>
        </View>
        <StepList
          steps={reading.plan.steps}
          progress={progress.steps}
          currentKey={reading.step.key}
          onGo={onGo}
        />
      </ScrollView>
      <View role="main" style={styles.work}>
        <View style={styles.top}>
          <View style={styles.switcher}>
            <Switcher {...props} />
          </View>
          <WideTools projectId={reading.project.id} tools={props.tools} chip={desk} />
        </View>
        <View
          style={[
            styles.columns,
            !desk && styles.stacked,
            props.leftHanded && desk && styles.mirrored,
          ]}
        >
          <ScrollView
            style={desk ? styles.half : styles.shrink}
            contentContainerStyle={styles.reading}
          >
            <Instruction {...props} />
            <Drawing
              {...props}
              height={Math.max(DIAGRAM_PX, desk ? height - AROUND_DIAGRAM_PX : DIAGRAM_PX)}
            />
            <Row {...props} />
          </ScrollView>
          <View style={desk ? styles.tally : styles.half}>{tally}</View>
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  sideBySide: { flexDirection: 'row' },
  edge: { paddingHorizontal: pageEdge.phone },
  reading: { gap: 4, paddingBottom: 4 },
  shrink: { flexGrow: 0, flexShrink: 1 },
  zone: { flex: 1, paddingHorizontal: 6, paddingTop: 7, paddingBottom: 6 },
  columns: { flex: 1, flexDirection: 'row', gap: 20, minHeight: 0 },
  stacked: { flexDirection: 'column', gap: 12 },
  mirrored: { flexDirection: 'row-reverse' },
  half: { flex: 1, gap: 12, minWidth: 0, paddingBottom: 8 },
  tally: { width: TALLY_PX, gap: 12 },
  list: { width: STEPS_PX, flexGrow: 0, borderRightWidth: border.hair },
  listHead: { padding: 20, gap: 4 },
  project: { fontSize: 26, lineHeight: 31 },
  work: {
    flex: 1,
    minWidth: 0,
    paddingHorizontal: pageEdge.wide,
    paddingTop: 16,
    paddingBottom: 24,
    gap: 12,
  },
  top: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: 12 },
  switcher: { flexGrow: 1, flexShrink: 1, maxWidth: 404 },
});
