import { type Href, router, useLocalSearchParams } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
import { DeleteProject } from '@/components/projects/delete-project';
import { pickCurrentStep, stepsLine } from '@/components/projects/progress-texts';
import { ProjectName } from '@/components/projects/project-name';
import { ProjectPage } from '@/components/projects/project-page';
import { ProjectStations } from '@/components/projects/project-stations';
import { ProjectSteps } from '@/components/projects/project-steps';
import type { ProjectReading } from '@/components/projects/read-project';
import { stationHref } from '@/components/projects/station-href';
import { writeTotals } from '@/components/plan/plan-facts';
import { Button } from '@/components/ui/button';
import { Meter } from '@/components/ui/meter';
import { STATION_NAMES } from '@/components/ui/stations';
import { space } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

const BACK = { label: 'Projects', href: '/projects' };

/** `/projects/[id]`: the project, how far it is, and the ways on from here. */
export function ProjectScreen() {
  const { id } = useLocalSearchParams<{ id: string }>();
  return (
    <ProjectPage
      id={id}
      title={({ project }) => project.name}
      back={() => BACK}
      aside={(reading) => <Work reading={reading} />}
    >
      {(reading) => <Overview reading={reading} />}
    </ProjectPage>
  );
}

function Overview({ reading }: { reading: ProjectReading }) {
  const { project, plan, progress } = reading;
  const step = pickCurrentStep(progress.steps, project.lastStepKey);
  const done = progress.steps.filter(({ toGo }) => toGo === 0).length;
  return (
    <View style={styles.column}>
      {project.note ? <Txt>{project.note}</Txt> : null}
      <View style={styles.picture}>
        <BlockDrawing plan={plan} size={256} letters />
      </View>
      <Txt color="ink2">{writeTotals(plan)}</Txt>
      <View style={styles.progress}>
        <Txt>{stepsLine(progress.steps)}</Txt>
        <Meter value={done} of={progress.steps.length} label="Steps done" />
      </View>
      {step ? (
        <Button
          label={`Carry on at the ${STATION_NAMES[step.station]}`}
          icon="arrowRight"
          onPress={() => router.push(stationHref(project.id, step.station, step.role))}
          testID="carry-on-go"
        />
      ) : null}
      <Button
        label="See the plan"
        icon="file"
        kind="second"
        onPress={() => router.push(`/projects/${project.id}/plan` as Href)}
        testID="see-plan"
      />
      <ProjectName project={project} />
      <Button
        label="Copy to a new project"
        icon="copy"
        kind="second"
        onPress={() => router.push(`/projects/new?from=${project.id}` as Href)}
        testID="copy-project"
      />
      <DeleteProject project={project} />
    </View>
  );
}

function Work({ reading }: { reading: ProjectReading }) {
  return (
    <View style={styles.column}>
      <Txt kind="section" heading={2}>
        By station
      </Txt>
      <ProjectStations reading={reading} />
      <Txt kind="section" heading={2}>
        All steps
      </Txt>
      <ProjectSteps reading={reading} />
    </View>
  );
}

const styles = StyleSheet.create({
  column: { gap: space[3], marginBottom: space[4] },
  picture: { alignItems: 'center' },
  progress: { gap: 6 },
});
