import { Pressable, StyleSheet, View } from 'react-native';

import { isFull } from '@/components/station/pick-lane';
import { laneName, unitWord } from '@/components/steps/messages';
import { itemLetters } from '@/components/steps/item-words';
import { Icon } from '@/components/ui/icon';
import { font } from '@/components/ui/type';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { pressable, webOnly } from '@/components/ui/web-only';
import type { Station } from '@/shared/model/codes';
import type { PlanStep } from '@/shared/model/plan';
import type { LaneProgress } from '@/shared/model/tally';

interface LaneChipsProps {
  step: PlanStep;
  lanes: readonly LaneProgress[];
  laneKey: string | null;
  onChoose: (key: string) => void;
}

/** The lanes of a step: the one in hand stands out, full ones have a check, a tap changes. */
export function LaneChips({ step, lanes, laneKey, onChoose }: LaneChipsProps) {
  if (lanes.length < 2) return null;
  return (
    <View role="group" aria-label="What to count" style={styles.row}>
      {lanes.map((lane) => (
        <LaneChip
          key={lane.lane.key}
          lane={lane}
          name={shortName(step, lane)}
          words={spokenWords(step, lane)}
          station={step.station}
          chosen={lane.lane.key === laneKey}
          onPress={() => onChoose(lane.lane.key)}
        />
      ))}
    </View>
  );
}

interface LaneChipProps {
  lane: LaneProgress;
  name: string;
  words: SpokenWords;
  station: Station;
  chosen: boolean;
  onPress: () => void;
}

function LaneChip({ lane, name, words, station, chosen, onPress }: LaneChipProps) {
  const theme = useTheme();
  const dye = theme.station(station);
  const paint = chosen
    ? { backgroundColor: dye.tint, borderColor: dye.ink }
    : { backgroundColor: theme.color.sunk, borderColor: 'transparent' };
  const ink = chosen ? dye.ink : theme.color.ink;
  return (
    <Pressable
      {...pressable}
      role="button"
      {...deviceName(`${words.lane}, ${words.done} ${words.target}`)}
      {...webOnly({ 'aria-pressed': chosen })}
      testID={`lane-${lane.lane.key}`}
      onPress={onPress}
      style={styles.hit}
    >
      <View style={[styles.pill, paint]}>
        <Txt kind="small" color={ink} style={styles.name}>
          {name}
        </Txt>
        {isFull(lane) ? (
          <>
            <Icon name="check" size={16} color={ink} />
            <Spoken>{` ${words.done}`}</Spoken>
          </>
        ) : (
          <Txt kind="small" color={ink}>
            {String(words.done)}
          </Txt>
        )}
        <Spoken>{` ${words.target}, ${words.lane}`}</Spoken>
      </View>
    </Pressable>
  );
}

/** "A+C"; "D recut" for a lane opened later; the unit where fabrics do not matter. */
function shortName(step: PlanStep, lane: LaneProgress): string {
  const letters = Object.keys(lane.lane.makes).map(itemLetters).join('');
  if (lane.extra) return `${letters} recut`;
  return letters === '' ? laneName(step, lane.lane) : letters;
}

interface SpokenWords {
  lane: string;
  done: number;
  /** "of 24 pairs" */
  target: string;
}

function spokenWords(step: PlanStep, lane: LaneProgress): SpokenWords {
  const target = lane.lane.target * lane.perTap;
  return {
    lane: laneName(step, lane.lane),
    done: lane.done * lane.perTap,
    target: `of ${target} ${unitWord(step.role, target)}`,
  };
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 6 },
  hit: { minHeight: 48, minWidth: 48, justifyContent: 'center' },
  pill: {
    minHeight: 34,
    minWidth: 48,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 6,
    paddingHorizontal: 11,
    borderRadius: 17,
    borderWidth: 1.5,
  },
  name: { fontFamily: font.bold },
});
