import { useState } from 'react';

import { useToast } from '@/components/providers/toast';
import { failureTexts } from '@/components/shell/store-texts';
import { type ActDone } from '@/components/station/count-acts';
import { momentOf } from '@/components/station/moment-of';
import { type RecutAnswer, recutAnswer } from '@/components/station/recut-answer';
import { shownCount } from '@/components/station/step-reading';
import { useFeedback } from '@/components/station/use-feedback';
import { type StepCounts, useStepCounts } from '@/components/station/use-step-counts';
import type { StoreFailure } from '@/sync/client/projects-client';

interface StationActs {
  counts: StepCounts;
  answer: RecutAnswer | null;
  closeAnswer: () => void;
  /** why the last act is not on disk; the counts shown are those that are */
  failure: StoreFailure | null;
}

/** The counts of a step, with what the maker feels, hears and reads after each act. */
export function useStationActs(projectId: string, stepKey: string): StationActs {
  const feedback = useFeedback();
  const toast = useToast();
  const [answer, setAnswer] = useState<RecutAnswer | null>(null);
  const [failure, setFailure] = useState<StoreFailure | null>(null);

  const onDone = (done: ActDone) => {
    setFailure(null);
    const { step, progress } = done.after;
    feedback(momentOf(done), `${progress.good} of ${step.target}`);
    const change = progress.good - done.before.progress.good;
    if (done.act === 'undo') showUndone(done, change);
    if (done.act === 'unpick') {
      toast.show({ text: `Took ${-change} off. Now ${progress.good}.` });
    }
    if (done.act === 'lost') setAnswer(recutAnswer(done.after, done.lane, -change));
  };
  const onFailure = (reason: StoreFailure) => {
    setFailure(reason);
    feedback('caution');
  };
  const counts = useStepCounts(projectId, stepKey, { onDone, onFailure });

  const showUndone = (done: ActDone, change: number) => {
    const { good } = done.after.progress;
    const { undone, lane, before } = done;
    const kind = undone?.kind ?? 'done';
    const shown = shownCount(before.project, { step: stepKey, lane, kind });
    toast.show({
      text: change > 0 ? `Put back ${change}. Now ${good}.` : `Took back ${-change}. Now ${good}.`,
      action: { label: 'Put back', onPress: () => counts.acts.putBack(undone, lane, shown) },
    });
  };

  return { counts, answer, closeAnswer: () => setAnswer(null), failure };
}

/** "Not counted" with the reason, for the page to show until the next act works. */
export function failureTitle(failure: StoreFailure): string {
  return `Not counted. ${failureTexts(failure).title}.`;
}
