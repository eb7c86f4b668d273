import AsyncStorage from '@react-native-async-storage/async-storage';
import { useCallback, useEffect, useState } from 'react';

import { type SetupDraft, SetupDraftSchema } from '@/components/plan/draft';

/** What was kept, when it can still be read. */
export function parseDraft(text: string | null): SetupDraft | null {
  if (text === null) return null;
  try {
    const parsed = SetupDraftSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

export interface KeptDraft {
  /** undefined until the storage was read */
  kept: SetupDraft | null | undefined;
  keep(draft: SetupDraft): void;
  clear(): Promise<void>;
}

/**
 * The draft of one form in AsyncStorage, written at every change so that a reload loses nothing.
 * A device without storage still has its form: the draft then lasts as long as the page.
 */
export function useKeptDraft(key: string): KeptDraft {
  const [kept, setKept] = useState<SetupDraft | null | undefined>(undefined);
  useEffect(() => {
    let gone = false;
    AsyncStorage.getItem(key).then(
      (text) => !gone && setKept(parseDraft(text)),
      () => !gone && setKept(null),
    );
    return () => {
      gone = true;
    };
  }, [key]);
  const keep = useCallback(
    (draft: SetupDraft) => {
      AsyncStorage.setItem(key, JSON.stringify(draft)).catch(() => undefined);
    },
    [key],
  );
  const clear = useCallback(async () => {
    await AsyncStorage.removeItem(key).catch(() => undefined);
  }, [key]);
  return { kept, keep, clear };
}
