import type { Asked } from '@/components/station/use-step-counts';
import { laneName, unitWord } from '@/components/steps/messages';
import { Dialog } from '@/components/ui/dialog';
import type { PlanStep } from '@/shared/model/plan';

interface CountDialogProps {
  step: PlanStep;
  asked: Asked | null;
  good: number;
  onClose: () => void;
}

/** Asks before a count that looks wrong is kept; the count stays open to either answer. */
export function CountDialog({ step, asked, good, onClose }: CountDialogProps) {
  if (!asked) return null;
  return (
    <Dialog
      open
      title={questionText(step, asked)}
      onClose={onClose}
      testID="count-question"
      actions={[
        { label: `Keep ${good}`, onPress: onClose, testID: 'count-no' },
        { label: 'Count it', onPress: asked.confirm, testID: 'count-yes' },
      ]}
    />
  );
}

/** "105 of 100 pieces. Count it?" */
export function questionText(step: PlanStep, { question, lane }: Asked): string {
  if (question.kind === 'over-step') {
    const { would, target } = question;
    return `${would} of ${target} ${unitWord(step.role, target)}. Count it?`;
  }
  if (question.kind === 'over-lane') {
    return `${question.would} of ${question.target}, ${laneName(step, lane.lane)}. Count it?`;
  }
  if (question.kind === 'jump') {
    const unit = unitWord(step.role, question.pieces);
    return `${question.pieces} ${unit} more, ${question.stacks} stacks at once. Count it?`;
  }
  return `${question.reason}. Count it all the same?`;
}
