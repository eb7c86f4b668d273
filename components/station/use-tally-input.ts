import { useCallback, useEffect, useMemo, useRef } from 'react';

import { listenToKeys } from '@/components/station/listen-to-keys';
import {
  IDLE_INPUT,
  readTallyInput,
  type TallyInputEvent,
} from '@/components/station/tally-input-machine';

export interface TallyInput {
  onTouchBegan: () => void;
  onTouchEnded: () => void;
  onTouchCancelled: () => void;
  onLongPress: () => void;
}

interface TallyInputActs {
  /** false while a dialog is open or the station is locked: no key counts then */
  active: boolean;
  onCount: () => void;
  onUndo: () => void;
  onKeypad: () => void;
}

/** Turns touches on the zone, and keys anywhere on the page, into counts. */
export function useTallyInput(acts: TallyInputActs): TallyInput {
  const state = useRef(IDLE_INPUT);
  const latest = useRef(acts);
  useEffect(() => {
    latest.current = acts;
  });
  const send = useCallback((event: TallyInputEvent) => {
    const step = readTallyInput(state.current, event);
    state.current = step.state;
    if (step.effect === 'count') latest.current.onCount();
    if (step.effect === 'undo') latest.current.onUndo();
    if (step.effect === 'keypad') latest.current.onKeypad();
  }, []);
  const { active } = acts;
  useEffect(() => (active ? listenToKeys(send) : undefined), [active, send]);
  return useMemo(
    () => ({
      onTouchBegan: () => send({ type: 'touch-began', atMs: performance.now() }),
      onTouchEnded: () => send({ type: 'touch-ended', atMs: performance.now() }),
      onTouchCancelled: () => send({ type: 'touch-cancelled' }),
      onLongPress: () => send({ type: 'long-press' }),
    }),
    [send],
  );
}
