import { enoughText } from '@/components/station/enough-text';
import type { TallyInput } from '@/components/station/use-tally-input';
import { madeWord, unitWord } from '@/components/steps/messages';
import { TallyZone } from '@/components/ui/tally-zone';
import type { PlanStep } from '@/shared/model/plan';
import type { LaneProgress, StepProgress } from '@/shared/model/tally';

interface TallyPanelProps {
  step: PlanStep;
  progress: StepProgress;
  lane: LaneProgress | null;
  /** taps of one stack, where stacks are cut */
  perStack: number | null;
  input: TallyInput;
  locked: boolean;
  onUnlock: () => void;
  minHeight: number;
}

/** More short ticks than this would run together. */
const MOST_TICKS = 60;
const TEN = 10;

/** The count of a step, and the one place to hit. */
export function TallyPanel(props: TallyPanelProps) {
  const { step, progress, lane, perStack, input, locked, onUnlock, minHeight } = props;
  const perTap = lane?.perTap ?? 1;
  const caption = `of ${step.target} ${unitWord(step.role, step.target)} ${madeWord(step.role)}`;
  const note = enoughText(progress, lane);
  return (
    <TallyZone
      station={step.station}
      shown={progress.good}
      target={step.target}
      perTap={perTap}
      caption={caption}
      note={note ?? undefined}
      full={progress.toGo === 0}
      locked={locked}
      label={`${progress.good} ${caption}. Tap adds ${perTap}.`}
      onPressIn={input.onTouchBegan}
      onTap={input.onTouchEnded}
      onLongPress={input.onLongPress}
      onUnlock={onUnlock}
      ruler={rulerOf(step.target, perTap, perStack)}
      minHeight={minHeight}
    />
  );
}

/** A short tick a tap and a long one a stack; by tens where no stacks are cut. */
function rulerOf(target: number, perTap: number, perStack: number | null) {
  const longTick = perStack === null ? TEN : perStack * perTap;
  const tick = target / perTap > MOST_TICKS ? longTick : perTap;
  return longTick < target ? { tick, longTick } : { tick };
}
