import { useEffect, useState } from 'react';
import { AccessibilityInfo, Platform } from 'react-native';

/** A browser says so at once: a sheet that began to slide and then may not would never be open. */
function readNow(): boolean {
  if (Platform.OS !== 'web' || typeof window.matchMedia !== 'function') return false;
  return window.matchMedia('(prefers-reduced-motion: reduce)').matches;
}

/** Whether the device asks for no movement. */
export function useReducedMotion(): boolean {
  const [reduced, setReduced] = useState(readNow);
  useEffect(() => {
    let gone = false;
    AccessibilityInfo.isReduceMotionEnabled().then(
      (answer) => !gone && setReduced(answer),
      () => undefined, // the device does not say: movement stays
    );
    const watch = AccessibilityInfo.addEventListener('reduceMotionChanged', setReduced);
    return () => {
      gone = true;
      watch.remove();
    };
  }, []);
  return reduced;
}
