import type { Ref } from 'react';
import { StyleSheet, type Text, View } from 'react-native';

import { StepDiagram } from '@/components/diagrams/step-diagram';
import { Controls } from '@/components/station/controls';
import { lossControl } from '@/components/station/losses';
import { countReady } from '@/components/station/pick-step';
import { StationHeader } from '@/components/station/station-header';
import type { StationTools } from '@/components/station/station-tools';
import { StepChips } from '@/components/station/step-chips';
import type { OpenDialog } from '@/components/station/step-dialogs';
import { StepHead } from '@/components/station/step-head';
import { StepLine } from '@/components/station/step-line';
import { type StepReading, tapsPerStack } from '@/components/station/step-reading';
import { TallyPanel } from '@/components/station/tally-panel';
import { undoLabel } from '@/components/station/undo-label';
import { failureTitle } from '@/components/station/use-station-acts';
import type { TallyInput } from '@/components/station/use-tally-input';
import { IconButton } from '@/components/ui/icon-button';
import { Note } from '@/components/ui/note';
import { StationSwitcher } from '@/components/ui/station-switcher';
import { type Station, STATIONS } from '@/shared/model/codes';
import type { LaneProgress, Progress, StepProgress } from '@/shared/model/tally';
import type { StoreFailure } from '@/sync/client/projects-client';

export interface StationPartsProps {
  reading: StepReading;
  progress: Progress;
  lane: LaneProgress | null;
  tools: StationTools;
  input: TallyInput;
  failure: StoreFailure | null;
  title: string;
  titleRef: Ref<Text>;
  leftHanded: boolean;
  onGo: (step: StepProgress) => void;
  onStation: (station: Station) => void;
  onUndo: () => void;
  onChooseLane: (key: string) => void;
  onOpen: (dialog: OpenDialog) => void;
}

/** Back, project and step, and the tools. */
export function Head(props: StationPartsProps) {
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

/** "Step 4 of 18" */
export function stepText({ reading, progress }: Pick<StationPartsProps, 'reading' | 'progress'>) {
  return `Step ${reading.step.position} of ${progress.steps.length}`;
}

/** Tabs for the stations that the plan has steps for. */
export function Switcher({ reading, progress, onStation }: StationPartsProps) {
  const stations = STATIONS.filter((each) =>
    progress.steps.some(({ station }) => station === each),
  );
  return (
    <StationSwitcher
      stations={stations}
      station={reading.step.station}
      ready={countReady(progress.steps)}
      onChange={onStation}
    />
  );
}

/** What to do, and what the last act failed with. */
export function Instruction(props: StationPartsProps) {
  const { reading, lane, title, titleRef, failure, onChooseLane } = props;
  return (
    <View>
      <StepHead title={title} titleRef={titleRef} />
      {failure ? (
        <Note tone="error" title={failureTitle(failure)} text="Your count is kept." live />
      ) : null}
      <View style={styles.chips}>
        <StepChips reading={reading} lane={lane} onChooseLane={onChooseLane} />
      </View>
    </View>
  );
}

export function Drawing(props: StationPartsProps & { height: number }) {
  const { reading, lane, leftHanded, height } = props;
  return (
    <StepDiagram
      plan={reading.plan}
      step={reading.step}
      lane={lane?.lane ?? null}
      done={lane?.done ?? 0}
      height={height}
      leftHanded={leftHanded}
    />
  );
}

/** A caution or what comes next, and the way to all there is to know about the step. */
export function Row({ reading, progress, onGo, onOpen }: StationPartsProps) {
  const { plan, step, progress: own } = reading;
  return (
    <View style={styles.row}>
      <View style={styles.grow}>
        <StepLine step={step} steps={plan.steps} progress={progress} own={own} onGo={onGo} />
      </View>
      <IconButton
        icon="info"
        label="About this step"
        onPress={() => onOpen('about')}
        testID="about"
      />
    </View>
  );
}

export function CountControls(props: StationPartsProps) {
  const { reading, lane, tools, leftHanded, onUndo, onOpen } = props;
  const { project, step, progress } = reading;
  const loss = lossControl(reading);
  const undoable = project.undoable.find((act) => act.step === step.key);
  return (
    <Controls
      back={undoLabel(progress, undoable, lane)}
      onUndo={onUndo}
      onKeypad={() => onOpen('keypad')}
      loss={loss}
      onLoss={() => onOpen(loss.kind)}
      locked={tools.locked}
      mirrored={leftHanded}
    />
  );
}

export function Tally(props: StationPartsProps & { minHeight: number }) {
  const { reading, lane, tools, input, minHeight } = props;
  return (
    <TallyPanel
      step={reading.step}
      progress={reading.progress}
      lane={lane}
      perStack={lane ? tapsPerStack(reading, lane.lane.key) : null}
      input={input}
      locked={tools.locked}
      onUnlock={tools.onUnlock}
      minHeight={minHeight}
    />
  );
}

const styles = StyleSheet.create({
  chips: { paddingHorizontal: 4 },
  row: { flexDirection: 'row', alignItems: 'center', gap: 4 },
  grow: { flex: 1, minWidth: 0 },
});
