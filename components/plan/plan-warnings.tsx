import { StyleSheet, View } from 'react-native';

import { groupWarnings } from '@/components/plan/group-warnings';
import { Note } from '@/components/ui/note';
import { space } from '@/components/ui/theme';
import type { Plan } from '@/shared/model/plan';

interface PlanWarningsProps {
  plan: Plan;
  /** takes the offer of a warning; without it the offers are only told */
  onBuy?: (letters: readonly string[], yards: string) => void;
}

/** What to watch, each with the one thing to do about it. */
export function PlanWarnings({ plan, onBuy }: PlanWarningsProps) {
  if (plan.warnings.length === 0) return null;
  return (
    <View style={styles.notes} role="list" aria-label="Warnings">
      {groupWarnings(plan).map(({ title, text, offer }) => {
        const take = offer && onBuy ? () => onBuy(offer.letters, offer.buyYards) : null;
        return (
          <View role="listitem" key={title}>
            <Note
              tone="caution"
              title={title}
              text={take || !offer ? text : `${text} ${offer.label}.`}
              {...(take && offer && { action: { label: offer.label, onPress: take } })}
            />
          </View>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({ notes: { gap: space[2] } });
