import { useEffect, useState } from 'react';
import { AccessibilityInfo } from 'react-native';

/** Whether the device asks for no movement. */
export function useReducedMotion(): boolean {
  const [reduced, setReduced] = useState(false);
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
