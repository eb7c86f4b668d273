import { useState } from 'react';

import { laneName, unitWord } from '@/components/steps/messages';
import { Dialog } from '@/components/ui/dialog';
import { Stepper } from '@/components/ui/stepper';
import type { PlanStep } from '@/shared/model/plan';
import type { LaneProgress } from '@/shared/model/tally';

interface UnpickDialogProps {
  step: PlanStep;
  lane: LaneProgress;
  onUnpick: (taps: number) => void;
  onClose: () => void;
}

/** How many were unpicked: they come off the count and their pieces are on hand again. */
export function UnpickDialog({ step, lane, onUnpick, onClose }: UnpickDialogProps) {
  const [text, setText] = useState('1');
  const count = /^\d+$/.test(text) ? Number(text) : 0;
  const fits = count >= 1 && count <= lane.done;
  return (
    <Dialog
      open
      title={`How many ${unitWord(step.role, 2)} did you unpick?`}
      text={`${laneName(step, lane.lane)}. They come off the count, and their pieces are on hand again.`}
      onClose={onClose}
      testID="unpick-dialog"
      actions={[
        { label: `Keep ${lane.done}`, onPress: onClose, testID: 'unpick-no' },
        {
          label: `Unpick ${count}`,
          onPress: () => {
            if (fits) onUnpick(count);
          },
          testID: 'unpick-yes',
        },
      ]}
    >
      <Stepper
        label="How many"
        value={text}
        onChangeText={setText}
        onStep={(by) => setText(String(Math.max(1, count + by)))}
        canLess={count > 1}
        canMore={count < lane.done}
        error={fits ? undefined : `Use 1 to ${lane.done}.`}
        testID="unpick-count"
      />
    </Dialog>
  );
}
