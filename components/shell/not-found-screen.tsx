import { useRouter } from 'expo-router';

import { PlacePage } from '@/components/shell/place-page';
import { EmptyState } from '@/components/ui/empty-state';

/** An address that leads nowhere. */
export function NotFoundScreen() {
  const router = useRouter();
  return (
    <PlacePage place="ready" title="Nothing here">
      <EmptyState
        title="No page at this address"
        text="What you make is where you left it."
        actions={[
          { label: 'Go to Ready', icon: 'ready', onPress: () => router.replace('/') },
          { label: 'Projects', icon: 'projects', onPress: () => router.replace('/projects') },
        ]}
      />
    </PlacePage>
  );
}
