import { router } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
import { countLine, stepsLine } from '@/components/projects/progress-texts';
import { stationHref } from '@/components/projects/station-href';
import type { CarryOn } from '@/components/ready/carry-on';
import { stepTitle } from '@/components/steps/messages';
import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { RulerBar } from '@/components/ui/ruler-bar';
import { STATION_NAMES } from '@/components/ui/stations';
import { border, radius, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { useLayout } from '@/components/ui/use-layout';
import type { StepProgress } from '@/shared/model/tally';

/** Short ticks a tap makes, long ones a stack or a round of lanes: what the ruler is divided by. */
function ticksOf({ lanes, target }: StepProgress): { tick: number; longTick?: number } {
  const perTap = Math.max(1, ...lanes.map((lane) => lane.perTap));
  const tick = target / perTap > 40 ? Math.ceil(target / 20) : perTap;
  const fifths = Math.round(target / 5 / tick) * tick;
  return fifths > tick ? { tick, longTick: fifths } : { tick };
}

/** The project to carry on with: its picture, the step last worked at, and the way there. */
export function CarryOnCard({ carryOn }: { carryOn: CarryOn }) {
  const { reading, step } = carryOn;
  const { project, plan, progress } = reading;
  const theme = useTheme();
  const station = step?.station ?? 'table';
  const dye = theme.station(station);
  const wide = useLayout().kind !== 'phone';
  const planned = project.steps.find(({ key }) => key === step?.key);
  const open = () =>
    router.push(step ? stationHref(project.id, station, step.role) : `/projects/${project.id}`);
  const size = wide ? 286 : 226;
  const picture = <BlockDrawing plan={plan} size={size} letters={false} onDark backgroundless />;
  return (
    <View
      style={[styles.card, { backgroundColor: dye.fill, borderColor: dye.ink }]}
      testID="carry-on"
    >
      {wide ? null : <View style={styles.corner}>{picture}</View>}
      <View style={wide ? null : styles.left}>
        <Txt color={dye.onFill} style={styles.strong}>
          Carry on
        </Txt>
        <Txt kind="display" heading={2} color={dye.onFill} numberOfLines={3}>
          {project.name}
        </Txt>
        {project.note ? <Txt color={dye.onFill}>{project.note}</Txt> : null}
      </View>
      {wide ? <View style={styles.middle}>{picture}</View> : null}
      <View style={styles.now}>
        {step && planned ? (
          <>
            <View style={styles.task}>
              <Icon name={station} color={dye.onFill} />
              <Txt kind="lead" color={dye.onFill} style={styles.grow}>
                {stepTitle(planned)}
              </Txt>
            </View>
            <Txt color={dye.onFill}>{countLine(step)}</Txt>
            <RulerBar
              value={step.good}
              of={step.target}
              {...ticksOf(step)}
              station={station}
              onFill
              silent
            />
          </>
        ) : (
          <Txt kind="lead" color={dye.onFill}>
            {stepsLine(progress.steps)}
          </Txt>
        )}
        <Button
          label={step ? `Step ${step.position} at the ${STATION_NAMES[station]}` : 'Open it'}
          icon="arrowRight"
          kind="second"
          onPress={open}
          testID="carry-on-go"
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    borderRadius: radius.hero,
    borderWidth: border.zone,
    padding: 20,
    gap: 14,
    overflow: 'hidden',
  },
  corner: { position: 'absolute', top: -34, right: -56 },
  middle: { alignItems: 'center' },
  left: { minHeight: 164, paddingRight: 146 },
  now: { gap: 10 },
  task: { flexDirection: 'row', alignItems: 'center', gap: 10 },
  grow: { flex: 1 },
  strong: { fontFamily: font.strong },
});
