import { View } from 'react-native';

import { Spoken } from '@/components/ui/spoken';
import { useThrottled } from '@/components/ui/use-throttled';

const ONCE_A_SECOND_MS = 1000;

/** Words for screen readers only, read politely when they change, at most once a second. */
export function Announcement({ text }: { text: string }) {
  const said = useThrottled(text, ONCE_A_SECOND_MS);
  return (
    <View role="status" aria-live="polite">
      <Spoken>{said}</Spoken>
    </View>
  );
}
