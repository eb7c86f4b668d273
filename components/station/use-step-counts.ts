import { useCallback, useEffect, useMemo, useRef, useState } from 'react';

import { type ActEvents, type CountActs, createCountActs } from '@/components/station/count-acts';
import { type CountQuestion, guardCount } from '@/components/station/guard-count';
import { pickLane } from '@/components/station/pick-lane';
import { readStep, type StepReading, tapsPerStack } from '@/components/station/step-reading';
import { waitingText } from '@/components/station/enough-text';
import { withPending } from '@/components/station/with-pending';
import type { LaneProgress, StepProgress } from '@/shared/model/tally';

/** A count that waits for the maker's answer. */
export interface Asked {
  question: CountQuestion;
  lane: LaneProgress;
  confirm: () => void;
}

interface Hand {
  key: string | null;
  /** chosen with a chip: stays even when the lane is full, until the next count */
  chosen: boolean;
}

export interface StepCounts {
  acts: CountActs;
  asked: Asked | null;
  dismiss: () => void;
  laneOf: (progress: StepProgress) => LaneProgress | null;
  chooseLane: (key: string) => void;
  count: () => void;
  setTaps: (taps: number) => void;
}

/** Counts one step: finds the lane, asks where a count looks wrong, and keeps the rest in order. */
export function useStepCounts(id: string, stepKey: string, events: ActEvents): StepCounts {
  const [hand, setHand] = useState<Hand>({ key: null, chosen: false });
  const [asked, setAsked] = useState<Asked | null>(null);
  const early = useRef(false); // she was asked once whether to count before anything is on hand
  const acts = useMemo(() => createCountActs(id, stepKey), [id, stepKey]);
  useEffect(() => acts.listen(events));
  const laneOf = useCallback((progress: StepProgress) => laneInHand(progress, hand), [hand]);

  /** Keeps a change at once, or asks first. */
  const judge = (keep: (lane: LaneProgress) => void, taps: (lane: LaneProgress) => number) => {
    const reading = readStep(id, stepKey);
    if (!reading || asked) return;
    const progress = withPending(reading.progress, acts.pending);
    const lane = laneInHand(progress, hand);
    if (!lane) return;
    const keepNow = () => {
      setAsked(null);
      setHand({ key: lane.lane.key, chosen: false });
      keep(lane);
    };
    const adds = taps(lane) * lane.perTap;
    const question =
      notYet(progress, adds, early.current) ?? guardCount(standing(reading, progress, lane), adds);
    early.current = true;
    if (question) setAsked({ question, lane, confirm: keepNow });
    else keepNow();
  };

  return {
    acts,
    asked,
    dismiss: () => setAsked(null),
    laneOf,
    chooseLane: (key) => setHand({ key, chosen: true }),
    count: () =>
      judge(
        (lane) => acts.tap(lane.lane.key, 1),
        () => 1,
      ),
    setTaps: (taps) =>
      judge(
        (lane) => acts.set(lane.lane.key, taps),
        (lane) => taps - lane.done,
      ),
  };
}

function laneInHand(progress: StepProgress, hand: Hand): LaneProgress | null {
  const chosen = progress.lanes.find((lane) => hand.chosen && lane.lane.key === hand.key);
  return chosen ?? pickLane(progress, hand.key);
}

/** The first count of a step that has nothing on hand asks once; then it may run ahead. */
function notYet(step: StepProgress, adds: number, asked: boolean): CountQuestion | null {
  if (asked || adds <= 0 || step.made > 0 || step.toGo === 0 || step.ready > 0) return null;
  return { kind: 'not-yet', reason: waitingText(step) };
}

/** What the guard compares with; lost pieces may be made again without a question. */
function standing(reading: StepReading, progress: StepProgress, lane: LaneProgress) {
  const stack = tapsPerStack(reading, lane.lane.key);
  const single = progress.lanes.filter((each) => !each.extra).length === 1 && !lane.extra;
  const most = lane.lane.target * lane.perTap + progress.lost;
  return {
    laneGood: lane.done * lane.perTap,
    stepGood: progress.good,
    laneTarget: single ? Number.POSITIVE_INFINITY : most,
    stepTarget: reading.step.target,
    stackPieces: stack === null ? null : stack * lane.perTap,
  };
}
