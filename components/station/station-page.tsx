import { router } from 'expo-router';
import { useEffect, useState } from 'react';

import { useToast } from '@/components/providers/toast';
import { pickStep } from '@/components/station/pick-step';
import { stepOf } from '@/components/station/step-reading';
import { StepWork } from '@/components/station/step-work';
import { useKeepAwake } from '@/components/station/use-keep-awake';
import type { Station } from '@/shared/model/codes';
import type { Progress, StepProgress } from '@/shared/model/tally';
import type { ProjectView } from '@/sync/client/projects-client';

interface StationPageProps {
  project: ProjectView;
  progress: Progress;
  station: Station;
  role: string | undefined;
}

/** A station of a project at one step; lock and wakefulness outlive a change of step. */
export function StationPage({ project, progress, station, role }: StationPageProps) {
  const [locked, setLocked] = useState(false);
  const [sleepy, setSleepy] = useState(false);
  const awake = useKeepAwake(!sleepy);
  const toast = useToast();
  const own = pickStep(progress.steps, station, role);
  const shown = own?.role;
  // the step stays the same while it fills up: the address names it from now on
  useEffect(() => {
    if (shown !== undefined && shown !== role) router.setParams({ step: shown });
  }, [shown, role]);
  const reading = own ? stepOf(project, own.key) : null;
  if (!own || !reading) return null;

  const go = (step: StepProgress) => open(project.id, step.station, step.role);
  const changeStation = (next: Station) => {
    if (next !== station) open(project.id, next, undefined);
  };
  const onAwake = () => {
    if (awake === 'refused') toast.show({ text: 'This browser does not keep the screen awake.' });
    else setSleepy(!sleepy);
  };
  const onLock = () => {
    if (locked) toast.show({ text: 'Locked. Hold the big field for a second to unlock.' });
    else setLocked(true);
  };
  return (
    <StepWork
      key={own.key}
      reading={reading}
      progress={progress}
      tools={{ awake, onAwake, locked, onLock, onUnlock: () => setLocked(false) }}
      onGo={go}
      onStation={changeStation}
    />
  );
}

function open(id: string, station: Station, step: string | undefined): void {
  router.replace({
    pathname: '/projects/[id]/[station]',
    params: { id, station, ...(step !== undefined && { step }) },
  });
}
