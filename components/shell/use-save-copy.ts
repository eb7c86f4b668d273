import { useToast } from '@/components/providers/toast';
import { saveFile } from '@/components/ui/save-file';
import { projects } from '@/sync/client/projects';

/** Saves everything on this device as one JSON file, and says whether it worked. */
export function useSaveCopy(): () => Promise<void> {
  const { show } = useToast();
  return async () => {
    try {
      await saveFile('matside-copy.json', await projects.saveCopy(), 'application/json');
      show({ text: 'Copy saved' });
    } catch {
      show({ text: 'No copy could be saved' });
    }
  };
}
