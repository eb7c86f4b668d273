import AsyncStorage from '@react-native-async-storage/async-storage';
import { useCallback, useEffect, useRef, useState } from 'react';
import { AppState } from 'react-native';

import {
  type CuttingVisit,
  CuttingVisitSchema,
  needsCheck,
} from '@/components/safety/safety-rules';

const KEY = 'matside.cuttingVisit';
/** How often a visit that goes on is marked; well below the time that ends one. */
const MARK_MS = 30_000;

interface CuttingVisitState {
  /** the check stands before the work now */
  checkOpen: boolean;
  open: (how: CuttingVisit['opened'], adult: boolean) => void;
}

/**
 * The cutting visit of this device: kept over a reload, ended by 30 minutes away.
 *
 * @param cutting whether the step that shows is one that cuts
 * @param under18 whether someone under 18 cuts here
 */
export function useCuttingVisit(cutting: boolean, under18: boolean): CuttingVisitState {
  const visit = useRef<CuttingVisit | null>(null);
  const [loaded, setLoaded] = useState(false);
  const [checkOpen, setCheckOpen] = useState(false);

  useEffect(() => {
    let gone = false;
    void readVisit().then((kept) => {
      if (gone) return;
      visit.current ??= kept;
      setLoaded(true);
    });
    return () => {
      gone = true;
    };
  }, []);

  useEffect(() => {
    if (!loaded || !cutting) return undefined;
    const look = () => {
      if (AppState.currentState === 'background') return;
      const ask = needsCheck(visit.current, under18, Date.now());
      setCheckOpen(ask);
      if (!ask && visit.current) keepVisit(visit, { ...visit.current, lastSeenAtMs: Date.now() });
    };
    look();
    const marks = setInterval(look, MARK_MS);
    const back = AppState.addEventListener('change', look);
    return () => {
      clearInterval(marks);
      back.remove();
    };
  }, [loaded, cutting, under18]);

  const open = useCallback((how: CuttingVisit['opened'], adult: boolean) => {
    keepVisit(visit, { opened: how, adult, lastSeenAtMs: Date.now() });
    setCheckOpen(false);
  }, []);

  return { checkOpen: cutting && checkOpen, open };
}

async function readVisit(): Promise<CuttingVisit | null> {
  try {
    const text = await AsyncStorage.getItem(KEY);
    if (text === null) return null;
    const parsed = CuttingVisitSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null; // unreadable: the check opens, which is the cautious answer
  }
}

function keepVisit(visit: { current: CuttingVisit | null }, next: CuttingVisit): void {
  visit.current = next;
  // without storage the visit lasts as long as the page
  AsyncStorage.setItem(KEY, JSON.stringify(next)).catch(() => undefined);
}
