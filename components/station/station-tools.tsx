import { router } from 'expo-router';

import type { Awake } from '@/components/station/use-keep-awake';
import { IconButton } from '@/components/ui/icon-button';

export interface StationTools {
  awake: Awake;
  onAwake: () => void;
  locked: boolean;
  onLock: () => void;
  /** the zone was held long enough */
  onUnlock: () => void;
}

const AWAKE_LABELS: Record<Awake, string> = {
  asking: 'Awake',
  awake: 'Awake',
  refused: 'May sleep',
  off: 'May sleep',
};

/** Awake, Lock and First aid; the first two only where counting goes on. */
export function StationToolButtons({ tools }: { tools: StationTools | null }) {
  return (
    <>
      {tools ? (
        <>
          <IconButton
            icon="sun"
            label={AWAKE_LABELS[tools.awake]}
            word
            lit={tools.awake === 'awake'}
            onPress={tools.onAwake}
            testID="awake"
          />
          <IconButton
            icon={tools.locked ? 'lock' : 'unlock'}
            label="Lock"
            word
            lit={tools.locked}
            onPress={tools.onLock}
            testID="lock"
          />
        </>
      ) : null}
      <IconButton
        icon="firstAid"
        label="First aid"
        word
        onPress={() => router.push('/first-aid')}
        testID="first-aid"
      />
    </>
  );
}

/** Back to where she came from, or to the project after a deep link. */
export function BackButton({ projectId }: { projectId: string }) {
  return (
    <IconButton
      icon="back"
      label="Back"
      testID="back"
      onPress={() => {
        if (router.canGoBack()) router.back();
        else router.replace(`/projects/${projectId}`);
      }}
    />
  );
}
