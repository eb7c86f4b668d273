import {
  impactAsync,
  ImpactFeedbackStyle,
  notificationAsync,
  NotificationFeedbackType,
} from 'expo-haptics';
import { useCallback } from 'react';

import { useSettings } from '@/components/providers/settings';
import { click, speak } from '@/components/station/sound';

export type Moment = 'count' | 'undo' | 'stackDone' | 'stepDone' | 'caution';

const STRENGTH: Record<Exclude<Moment, 'caution'>, { style: ImpactFeedbackStyle; times: 1 | 2 }> = {
  count: { style: ImpactFeedbackStyle.Light, times: 1 },
  undo: { style: ImpactFeedbackStyle.Light, times: 2 },
  stackDone: { style: ImpactFeedbackStyle.Medium, times: 1 },
  stepDone: { style: ImpactFeedbackStyle.Medium, times: 2 },
};
const BETWEEN_MS = 90;

/** What is felt and heard after a count, as far as the maker's settings ask for it. */
export function useFeedback(): (moment: Moment, spoken?: string) => void {
  const { haptics, click: clicks, spokenCount } = useSettings().settings;
  return useCallback(
    (moment: Moment, spoken?: string) => {
      if (haptics) feel(moment);
      if (clicks && moment !== 'caution') click();
      if (spokenCount && spoken !== undefined) speak(spoken);
    },
    [haptics, clicks, spokenCount],
  );
}

function feel(moment: Moment): void {
  const ignore = () => undefined; // a device without a motor is no failure
  if (moment === 'caution') {
    notificationAsync(NotificationFeedbackType.Warning).catch(ignore);
    return;
  }
  const { style, times } = STRENGTH[moment];
  impactAsync(style).catch(ignore);
  if (times === 2) setTimeout(() => void impactAsync(style).catch(ignore), BETWEEN_MS);
}
