import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { SetupDraft } from '@/components/plan/draft';
import { count } from '@/components/plan/plan-facts';
import { SetupFields } from '@/components/plan/setup-fields';
import { SetupResult } from '@/components/plan/setup-result';
import { useSetup } from '@/components/plan/use-setup';
import { useSettings } from '@/components/providers/settings';
import { PlacePage } from '@/components/shell/place-page';
import { failureTexts } from '@/components/shell/store-texts';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Note } from '@/components/ui/note';
import { space } from '@/components/ui/theme';
import type { PlanRequest } from '@/shared/model/plan-request';
import { formatInches } from '@/shared/units/format-fraction';
import { projects } from '@/sync/client/projects';
import type { StoreFailure } from '@/sync/client/projects-client';

const BACK = { label: 'Projects', href: '/projects' } as const;

/** Wide enough for two steppers side by side; the result gets the rest. */
const FORM_PX = 372;

/** What a project is called when its maker names it nothing: "5 plates, 12 in". */
export function usualName(request: PlanRequest | undefined): string {
  if (!request) return 'Plates';
  return `${count(request.blocks, 'plate', 'plates')}, ${formatInches(request.block)}`;
}

interface SetupFormProps {
  start: SetupDraft;
  keep: (draft: SetupDraft) => void;
  clear: () => Promise<void>;
  onStartAfresh: () => Promise<void>;
}

/** The form and its live result; "Make the plan" turns them into a project. */
export function SetupForm({ start, keep, clear, onStartAfresh }: SetupFormProps) {
  const { settings } = useSettings();
  const setup = useSetup(start, settings, keep);
  const [failure, setFailure] = useState<StoreFailure | null>(null);
  const [making, setMaking] = useState(false);
  const name = usualName(setup.good?.request);

  const make = async () => {
    if (making || setup.showErrors() || !setup.good) return;
    setMaking(true);
    const { request } = setup.good;
    const made = await projects.create({ name: setup.draft.name.trim() || name, request });
    setMaking(false);
    if (!made.ok) return setFailure(made);
    await clear();
    router.replace(`/projects/${made.project.id}`);
  };

  const end = (
    <View style={styles.end}>
      <SetupResult setup={setup} />
      {failure ? (
        <Note
          tone="error"
          title={`${failureTexts(failure).title}.`}
          text="The plan is not kept yet. What you typed is."
          live
        />
      ) : null}
      <Button
        label={making ? 'Making the plan' : 'Make the plan'}
        icon="arrowRight"
        onPress={() => void make()}
        testID="make-plan"
      />
      <StartAfresh onStartAfresh={onStartAfresh} />
    </View>
  );
  return (
    <PlacePage
      place="projects"
      title="Plan the plates"
      chip
      back={BACK}
      aside={end}
      paneWidth={FORM_PX}
    >
      <View style={styles.form}>
        <SetupFields setup={setup} usualName={name} settingsBladeMm={settings.bladeMm} />
      </View>
    </PlacePage>
  );
}

function StartAfresh({ onStartAfresh }: { onStartAfresh: () => Promise<void> }) {
  const [asking, setAsking] = useState(false);
  return (
    <>
      <Button
        label="Start afresh"
        icon="refresh"
        kind="quiet"
        onPress={() => setAsking(true)}
        testID="start-afresh"
      />
      <Dialog
        open={asking}
        title="Start afresh?"
        text="What you typed here is cleared. Projects you made stay."
        actions={[
          { label: 'Keep typing', onPress: () => setAsking(false) },
          {
            label: 'Start afresh',
            kind: 'danger',
            testID: 'confirm-afresh',
            onPress: () => {
              setAsking(false);
              void onStartAfresh();
            },
          },
        ]}
        onClose={() => setAsking(false)}
      />
    </>
  );
}

const styles = StyleSheet.create({
  form: { gap: space[5], marginBottom: space[5] },
  end: { gap: space[4] },
});
