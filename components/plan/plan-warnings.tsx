import { StyleSheet, View } from 'react-native';

import { warningText } from '@/components/plan/messages';
import { Note } from '@/components/ui/note';
import { space } from '@/components/ui/theme';
import type { Plan } from '@/shared/model/plan';

interface PlanWarningsProps {
  plan: Plan;
  /** takes the offer of a warning; without it the offers are only told */
  onBuy?: (letter: string, yards: string) => void;
}

/** What to watch, each with the one thing to do about it. */
export function PlanWarnings({ plan, onBuy }: PlanWarningsProps) {
  if (plan.warnings.length === 0) return null;
  return (
    <View style={styles.notes} role="list" aria-label="Warnings">
      {plan.warnings.map((warning, at) => {
        const { title, text, offer } = warningText(warning, plan);
        const take = offer && onBuy ? () => onBuy(offer.letter, offer.buyYards) : null;
        return (
          <View role="listitem" key={`${warning.code} ${at}`}>
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
