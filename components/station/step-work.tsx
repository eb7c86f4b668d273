import { useIsFocused } from 'expo-router';
import { useEffect, useRef, useState } from 'react';
import type { Text } from 'react-native';

import { useSettings } from '@/components/providers/settings';
import { SafetyCheck } from '@/components/safety/safety-check';
import { isCutting } from '@/components/safety/safety-rules';
import { useCuttingVisit } from '@/components/safety/use-cutting-visit';
import { usePageTitle } from '@/components/shell/use-page-title';
import { StationLayout } from '@/components/station/station-layout';
import type { StationTools } from '@/components/station/station-tools';
import { type OpenDialog, StepDialogs } from '@/components/station/step-dialogs';
import type { StepReading } from '@/components/station/step-reading';
import { useStationActs } from '@/components/station/use-station-acts';
import { useTallyInput } from '@/components/station/use-tally-input';
import { stepTitle } from '@/components/steps/messages';
import type { Station } from '@/shared/model/codes';
import type { Progress, StepProgress } from '@/shared/model/tally';

interface StepWorkProps {
  reading: StepReading;
  progress: Progress;
  tools: StationTools;
  onGo: (step: StepProgress) => void;
  onStation: (station: Station) => void;
}

/** One step being worked at: its counts, its dialogs, and the check before cutting. */
export function StepWork({ reading, progress, tools, onGo, onStation }: StepWorkProps) {
  const { project, step, progress: own } = reading;
  const { settings, loaded } = useSettings();
  const heading = useRef<Text>(null);
  const [open, setOpen] = useState<OpenDialog>(null);
  const visit = useCuttingVisit(loaded && isCutting(step.role), settings.under18);
  const { counts, answer, closeAnswer, failure } = useStationActs(project.id, step.key);
  const lane = counts.laneOf(own);
  const title = stepTitle(step);

  usePageTitle(`${title} · ${project.name}`, heading);
  // the check and the work behind it take turns; the page's own first focus is the shell's
  const checkBefore = useRef(false);
  useEffect(() => {
    if (visit.checkOpen || checkBefore.current) heading.current?.focus();
    checkBefore.current = visit.checkOpen;
  }, [visit.checkOpen]);
  const focused = useIsFocused();
  const over = open !== null || counts.asked !== null || answer !== null;
  const undo = () => counts.acts.undo(lane?.lane.key ?? null);
  const input = useTallyInput({
    active: focused && !over && !tools.locked,
    onCount: counts.count,
    onUndo: undo,
    onKeypad: () => setOpen('keypad'),
  });
  const dialogs = (
    <StepDialogs
      {...{ reading, progress, lane, counts, open, answer, onGo }}
      onClose={() => setOpen(null)}
      onCloseAnswer={closeAnswer}
    />
  );
  if (visit.checkOpen) {
    return (
      <>
        <SafetyCheck reading={reading} titleRef={heading} onOpen={visit.open} />
        {dialogs}
      </>
    );
  }
  return (
    <>
      <StationLayout
        {...{ reading, progress, lane, tools, input, failure, title, onGo, onStation }}
        titleRef={heading}
        onUndo={undo}
        onChooseLane={counts.chooseLane}
        onOpen={setOpen}
        leftHanded={settings.leftHanded}
      />
      {dialogs}
    </>
  );
}
