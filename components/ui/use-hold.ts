import { useEffect, useRef } from 'react';

const FIRST_MS = 400;
const REPEAT_MS = 1000 / 6;

/**
 * Repeats an act while a button is held: the first time after 0.4 s, then 6 times a second.
 *
 * @returns props for a Pressable; a short press acts once
 */
export function useHold(act: () => void, possible: boolean) {
  const latest = useRef({ act, possible });
  const timer = useRef<ReturnType<typeof setInterval> | null>(null);
  useEffect(() => {
    latest.current = { act, possible };
  });
  const release = () => {
    if (timer.current !== null) clearInterval(timer.current);
    timer.current = null;
  };
  useEffect(() => release, []);
  const once = () => {
    if (latest.current.possible) latest.current.act();
    else release();
  };
  const hold = () => {
    release();
    once();
    timer.current = setInterval(once, REPEAT_MS);
  };
  return { onPress: once, onLongPress: hold, onPressOut: release, delayLongPress: FIRST_MS };
}
