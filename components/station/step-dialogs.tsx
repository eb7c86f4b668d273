import { AboutSheet } from '@/components/station/about-sheet';
import { CountDialog } from '@/components/station/count-dialog';
import { KeypadDialog } from '@/components/station/keypad-dialog';
import { LossDialog } from '@/components/station/loss-dialog';
import { recutLanes } from '@/components/station/recut-lanes';
import { losableItems } from '@/components/station/losable-items';
import { StepList } from '@/components/station/step-list';
import type { StepReading } from '@/components/station/step-reading';
import { UnpickDialog } from '@/components/station/unpick-dialog';
import type { StepCounts } from '@/components/station/use-step-counts';
import type { RecutAnswer } from '@/components/station/recut-answer';
import { Dialog } from '@/components/ui/dialog';
import { Sheet } from '@/components/ui/sheet';
import { Txt } from '@/components/ui/txt';
import type { LaneProgress, Progress, StepProgress } from '@/shared/model/tally';

export type OpenDialog = 'keypad' | 'loss' | 'unpick' | 'about' | 'steps' | null;

interface StepDialogsProps {
  reading: StepReading;
  progress: Progress;
  lane: LaneProgress | null;
  counts: StepCounts;
  open: OpenDialog;
  answer: RecutAnswer | null;
  onClose: () => void;
  onCloseAnswer: () => void;
  onGo: (step: StepProgress) => void;
}

/** Whatever stands over a station page: at most one of them is open. */
export function StepDialogs(props: StepDialogsProps) {
  const { reading, lane, counts, answer, open, onClose } = props;
  const { step, progress: own } = reading;
  if (counts.asked) {
    return (
      <CountDialog step={step} asked={counts.asked} good={own.good} onClose={counts.dismiss} />
    );
  }
  if (answer) return <AnswerDialog answer={answer} onClose={props.onCloseAnswer} />;
  if (open === 'keypad' && lane) {
    const set = (taps: number) => {
      onClose();
      counts.setTaps(taps);
    };
    return <KeypadDialog step={step} lane={lane} onTaps={set} onClose={onClose} />;
  }
  if (open === 'loss') return <Loss {...props} />;
  if (open === 'unpick' && lane) {
    const unpick = (taps: number) => {
      onClose();
      counts.acts.unpick(lane.lane.key, taps);
    };
    return <UnpickDialog step={step} lane={lane} onUnpick={unpick} onClose={onClose} />;
  }
  return <Sheets {...props} />;
}

function Loss({ reading, progress, counts, onClose }: StepDialogsProps) {
  const { plan, step, progress: own, project } = reading;
  return (
    <LossDialog
      plan={plan}
      step={step}
      items={losableItems(step, progress)}
      good={own.good}
      onClose={onClose}
      onLose={(item, pieces) => {
        onClose();
        counts.acts.lose(item, pieces, recutLanes(plan, project.extraLanes, item, pieces));
      }}
    />
  );
}

function Sheets({ reading, progress, lane, open, onClose, onGo }: StepDialogsProps) {
  const { plan, step, progress: own } = reading;
  const go = (next: StepProgress) => {
    onClose();
    onGo(next);
  };
  if (open === 'about') {
    const shown = lane?.lane ?? step.lanes[0] ?? null;
    return <AboutSheet {...{ plan, step, progress, own, onClose }} lane={shown} onGo={go} />;
  }
  if (open !== 'steps') return null;
  return (
    <Sheet open title="All steps" onClose={onClose} testID="steps-sheet">
      <StepList steps={plan.steps} progress={progress.steps} currentKey={step.key} onGo={go} />
    </Sheet>
  );
}

function AnswerDialog({ answer, onClose }: { answer: RecutAnswer; onClose: () => void }) {
  return (
    <Dialog
      open
      title={answer.title}
      onClose={onClose}
      testID="recut-answer"
      actions={[{ label: 'Go on', onPress: onClose, testID: 'recut-ok' }]}
    >
      {answer.texts.map((text) => (
        <Txt key={text}>{text}</Txt>
      ))}
      {answer.atTable ? <Txt>The Table has a lane for it.</Txt> : null}
    </Dialog>
  );
}
