import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';

import { countLine, isReady, stepLine } from '@/components/projects/progress-texts';
import type { ProjectReading } from '@/components/projects/read-project';
import { stationHref } from '@/components/projects/station-href';
import { stepTitle } from '@/components/steps/messages';
import { Icon } from '@/components/ui/icon';
import { StationBadge } from '@/components/ui/station-badge';
import { STATION_NAMES } from '@/components/ui/stations';
import { border, radius, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { PlanStep } from '@/shared/model/plan';
import type { StepProgress } from '@/shared/model/tally';

/** Every step in its order of work, with what is done of it. */
export function ProjectSteps({ reading }: { reading: ProjectReading }) {
  const { color } = useTheme();
  const { project, progress } = reading;
  return (
    <View
      role="list"
      style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}
    >
      {project.steps.map((step) => {
        const state = progress.steps.find(({ key }) => key === step.key);
        return state ? (
          <StepRow key={step.key} projectId={project.id} step={step} state={state} />
        ) : null;
      })}
    </View>
  );
}

interface StepRowProps {
  projectId: string;
  step: PlanStep;
  state: StepProgress;
}

function StepRow({ projectId, step, state }: StepRowProps) {
  const { color } = useTheme();
  const done = state.toGo === 0;
  const counted = countLine(state);
  const line = stepLine(state);
  return (
    <View role="listitem">
      <Link href={stationHref(projectId, step.station, step.role)} asChild>
        <Pressable
          role="link"
          testID={`step-${step.role}`}
          style={StyleSheet.flatten([styles.row, { borderColor: color.line }])}
        >
          <StationBadge station={step.station} size={32} ready={isReady(state)} />
          <View style={styles.words}>
            <Txt style={styles.title}>{`${step.position}. ${stepTitle(step)}`}</Txt>
            <Txt kind="small" color="ink2">
              {`${STATION_NAMES[step.station]} · ${done || line === counted ? line : `${counted}. ${line}`}`}
            </Txt>
          </View>
          {done ? <Icon name="check" color="mossInk" label="Done" /> : null}
        </Pressable>
      </Link>
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderWidth: border.hair, borderRadius: radius.card, overflow: 'hidden' },
  row: {
    minHeight: size.row,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
    paddingHorizontal: 14,
    paddingVertical: 8,
    borderBottomWidth: 1,
  },
  words: { flex: 1, minWidth: 0 },
  title: { fontFamily: font.strong },
});
