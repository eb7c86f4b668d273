import { useToast } from '@/components/providers/toast';
import { failureTexts } from '@/components/shell/store-texts';
import { projects } from '@/sync/client/projects';

/** Opens the example's projects on this device, and takes them away again. */
export function useExample(): { open(): Promise<void>; takeAway(): Promise<void> } {
  const { show } = useToast();
  return {
    async open() {
      const opened = await projects.openExample();
      show({ text: opened.ok ? 'Example opened' : failureTexts(opened).title });
    },
    async takeAway() {
      const removed = await projects.removeExample();
      show({
        text: removed.ok ? 'Example taken away' : failureTexts(removed).title,
        ...(removed.ok && {
          action: { label: 'Put back', onPress: () => void projects.openExample() },
        }),
      });
    },
  };
}
