import { useState } from 'react';

import { readKeypad } from '@/components/station/read-keypad';
import { laneName, madeWord, unitWord } from '@/components/steps/messages';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import type { PlanStep } from '@/shared/model/plan';
import type { LaneProgress } from '@/shared/model/tally';

interface KeypadDialogProps {
  step: PlanStep;
  lane: LaneProgress;
  onTaps: (taps: number) => void;
  onClose: () => void;
}

/** Sets an exact count, in pieces; between two cuts it offers the nearest counts. */
export function KeypadDialog({ step, lane, onTaps, onClose }: KeypadDialogProps) {
  const now = lane.done * lane.perTap;
  const [text, setText] = useState(String(now));
  const [tried, setTried] = useState(false);
  const answer = readKeypad(text, lane.perTap);
  const unit = unitWord(step.role, 2);
  const keep = { label: `Keep ${now}`, onPress: onClose, testID: 'keypad-no' };
  const setTo = (pieces: number, taps: number) => ({
    label: `Set to ${pieces}`,
    onPress: () => onTaps(taps),
    testID: `keypad-${pieces}`,
  });
  const actions =
    answer.kind === 'between'
      ? [
          keep,
          setTo(answer.below.pieces, answer.below.taps),
          setTo(answer.above.pieces, answer.above.taps),
        ]
      : [
          keep,
          answer.kind === 'taps'
            ? { ...setTo(Number(text.trim()), answer.taps), testID: 'keypad-yes' }
            : { label: 'Set the count', onPress: () => setTried(true), testID: 'keypad-yes' },
        ];
  const between =
    answer.kind === 'between' ? `One tap is ${lane.perTap}, so it is one of these.` : undefined;
  return (
    <Dialog
      open
      title={`How many ${unit} are ${madeWord(step.role)}?`}
      text={step.lanes.length > 1 || lane.extra ? laneName(step, lane.lane) : undefined}
      onClose={onClose}
      actions={actions}
      testID="keypad-dialog"
    >
      <Field
        label={`Count, in ${unit}`}
        value={text}
        onChangeText={setText}
        onBlur={() => setTried(true)}
        inputMode="numeric"
        maxLength={6}
        hint={between}
        error={
          tried && answer.kind === 'nonsense' ? 'Not a count. Use 0 or a whole number.' : undefined
        }
        testID="keypad-field"
      />
    </Dialog>
  );
}
