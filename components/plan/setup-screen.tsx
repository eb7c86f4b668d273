import { router, useLocalSearchParams } from 'expo-router';
import { useState } from 'react';

import { startDraft } from '@/components/plan/draft';
import { draftFromRequest } from '@/components/plan/draft-from-request';
import { SetupForm } from '@/components/plan/setup-form';
import { useKeptDraft } from '@/components/plan/use-kept-draft';
import { useProjects } from '@/components/projects/use-projects';
import { useSettings } from '@/components/providers/settings';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { ErrorState } from '@/components/ui/error-state';
import { LoadingBlocks } from '@/components/ui/loading-blocks';

const SETUP_TITLE = 'Plan the plates';
const BACK = { label: 'Projects', href: '/projects' } as const;

/** `/projects/new`, and `/projects/new?from=<project>` for a copy of its plan. */
export function SetupScreen() {
  const { from } = useLocalSearchParams<{ from?: string }>();
  return <SetupOf key={from ?? ''} from={from ?? null} />;
}

function SetupOf({ from }: { from: string | null }) {
  const { kept, keep, clear } = useKeptDraft(`matside.setup.${from ?? 'new'}`);
  const { settings, loaded } = useSettings();
  const { status, projects } = useProjects();
  const [round, setRound] = useState(0);
  if (kept === undefined || !loaded || status.phase !== 'ready') {
    return (
      <PlacePage place="projects" title={SETUP_TITLE} back={BACK}>
        <StoreGate>
          <LoadingBlocks label="Opening the plan" />
        </StoreGate>
      </PlacePage>
    );
  }
  const source = projects.find(({ id }) => id === from);
  const fresh =
    from === null
      ? startDraft()
      : source && draftFromRequest(`${source.name}, copy`, source.request, settings);
  const start = round === 0 ? (kept ?? fresh) : fresh;
  if (!start) {
    return (
      <PlacePage place="projects" title={SETUP_TITLE} back={BACK}>
        <ErrorState
          title="This project is not here"
          text="It may be on another device. Your other projects are kept."
          actions={[{ label: 'All projects', onPress: () => router.replace('/projects') }]}
        />
      </PlacePage>
    );
  }
  const startAfresh = async () => {
    await clear();
    setRound(round + 1);
  };
  return (
    <SetupForm key={round} start={start} keep={keep} clear={clear} onStartAfresh={startAfresh} />
  );
}
