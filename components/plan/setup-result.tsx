import { memo, useCallback } from 'react';
import { StyleSheet, View } from 'react-native';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
import type { SetupDraft } from '@/components/plan/draft';
import { buyFabric } from '@/components/plan/draft-fabrics';
import { FabricTable } from '@/components/plan/fabric-table';
import { FactList } from '@/components/plan/fact-list';
import { count, listFacts, writeTotals } from '@/components/plan/plan-facts';
import { PlanWarnings } from '@/components/plan/plan-warnings';
import type { Setup } from '@/components/plan/use-setup';
import { Note } from '@/components/ui/note';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { useLayout } from '@/components/ui/use-layout';
import type { Plan } from '@/shared/model/plan';

/** What the form comes to, live; while something is wrong the last good result stays, dimmed. */
export function SetupResult({ setup }: { setup: Setup }) {
  const { good, current, errors, change } = setup;
  if (!good) return <Note tone="error" title="No plan yet." text="Mend the fields marked first." />;
  return (
    <View style={styles.result} testID="result">
      {current ? null : (
        <Note
          tone="info"
          title="This is the last plan that worked."
          text={errors.form ?? 'It follows again once every field is right.'}
          live
          testID="last-good"
        />
      )}
      <View style={current ? null : styles.dimmed} testID="figures">
        <Figures plan={good.plan} dim={!current} change={change} />
      </View>
    </View>
  );
}

interface FiguresProps {
  plan: Plan;
  dim: boolean;
  change: (update: (draft: SetupDraft) => SetupDraft) => void;
}

/** Drawn again only for another plan, so that typing stays quick. */
const Figures = memo(function Figures({ plan, dim, change }: FiguresProps) {
  const { color } = useTheme();
  const wide = useLayout().kind !== 'phone';
  const buy = useCallback(
    (letters: readonly string[], yards: string) =>
      change((draft) => letters.reduce((old, letter) => buyFabric(old, letter, yards), draft)),
    [change],
  );
  return (
    <View style={styles.result}>
      <View style={styles.totals}>
        <Txt kind="lead" heading={2} style={styles.sum} testID="totals">
          {writeTotals(plan)}
        </Txt>
        <Txt color="ink2">{count(plan.totals.wedges, 'wedge', 'wedges')}</Txt>
      </View>
      <View style={wide ? styles.beside : styles.result}>
        <View style={styles.picture}>
          <View style={dim ? styles.faded : null} testID="drawing">
            <BlockDrawing plan={plan} size={256} letters />
          </View>
          <View style={styles.facts}>
            <FactList facts={listFacts(plan)} />
          </View>
        </View>
        <View
          style={[
            styles.card,
            wide && styles.wideCard,
            { backgroundColor: color.card, borderColor: color.line },
          ]}
          testID="fabric-table"
        >
          <FabricTable plan={plan} />
        </View>
      </View>
      <PlanWarnings plan={plan} onBuy={buy} />
    </View>
  );
});

const styles = StyleSheet.create({
  result: { gap: space[4] },
  // words stay at 4.5 : 1 on paper; only the picture may fade further
  dimmed: { opacity: 0.86 },
  faded: { opacity: 0.5 },
  totals: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    justifyContent: 'space-between',
    gap: space[2],
  },
  sum: { fontSize: 24, lineHeight: 30 },
  beside: { flexDirection: 'row', flexWrap: 'wrap', gap: space[5], alignItems: 'flex-start' },
  picture: { alignItems: 'center', gap: space[2] },
  facts: { width: '100%', minWidth: 256, maxWidth: 420 },
  card: {
    borderWidth: border.hair,
    borderRadius: radius.card,
    paddingHorizontal: 14,
    paddingVertical: 8,
  },
  wideCard: { flexGrow: 1, flexShrink: 1, flexBasis: 340 },
});
