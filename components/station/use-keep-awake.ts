import { activateKeepAwakeAsync, deactivateKeepAwake } from 'expo-keep-awake';
import { useEffect, useState } from 'react';
import { AppState } from 'react-native';

const TAG = 'station';

export type Awake = 'asking' | 'awake' | 'refused' | 'off';

/**
 * Keeps the screen awake while a station is open and lets go on leaving. A browser drops the
 * lock with a hidden page, so it is asked again when the page comes back.
 *
 * @param wanted false when the maker switched it off for now
 */
export function useKeepAwake(wanted: boolean): Awake {
  const [awake, setAwake] = useState<Awake>('asking');
  useEffect(() => {
    if (!wanted) return undefined;
    let gone = false;
    const ask = () => {
      if (AppState.currentState === 'background') return;
      activateKeepAwakeAsync(TAG).then(
        () => !gone && setAwake('awake'),
        () => !gone && setAwake('refused'),
      );
    };
    ask();
    const back = AppState.addEventListener('change', ask);
    return () => {
      gone = true;
      back.remove();
      deactivateKeepAwake(TAG).catch(() => undefined); // nothing was held: nothing to let go
    };
  }, [wanted]);
  return wanted ? awake : 'off';
}
