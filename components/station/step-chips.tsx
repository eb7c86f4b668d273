import { StyleSheet, View } from 'react-native';

import { LaneChips } from '@/components/station/lane-chips';
import { stackFacts } from '@/components/station/stack-facts';
import type { StepReading } from '@/components/station/step-reading';
import { stepFacts } from '@/components/steps/step-facts';
import { Chip } from '@/components/ui/chip';
import type { LaneProgress } from '@/shared/model/tally';

interface StepChipsProps {
  reading: StepReading;
  lane: LaneProgress | null;
  onChooseLane: (key: string) => void;
}

/** Lanes to choose from, then the facts: layers and stack, or seam, stitch and needle. */
export function StepChips({ reading, lane, onChooseLane }: StepChipsProps) {
  const { step, progress } = reading;
  const [first, ...others] = stackFacts(reading, lane);
  const facts = [...others, ...stepFacts(step)];
  return (
    <View>
      <LaneChips
        step={step}
        lanes={progress.lanes}
        laneKey={lane?.lane.key ?? null}
        onChoose={onChooseLane}
      />
      {first !== undefined || facts.length > 0 ? (
        <View style={styles.facts}>
          {first !== undefined ? (
            <Chip label={first} icon="layers" tone="station" station={step.station} />
          ) : null}
          {facts.map((fact) => (
            <Chip key={fact} label={fact} />
          ))}
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  facts: { flexDirection: 'row', flexWrap: 'wrap', gap: 8, paddingVertical: 4 },
});
