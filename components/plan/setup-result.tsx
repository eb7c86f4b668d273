import { StyleSheet, View } from 'react-native';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
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

/** What the form comes to, live; while something is wrong the last good result stays, dimmed. */
export function SetupResult({ setup }: { setup: Setup }) {
  const { good, current, errors, change } = setup;
  const { color } = useTheme();
  const wide = useLayout().kind !== 'phone';
  if (!good) return <Note tone="error" title="No plan yet." text="Mend the fields marked first." />;
  const { plan } = good;
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
      <View style={[styles.result, current ? null : styles.dimmed]} testID="figures">
        <View style={styles.totals}>
          <Txt kind="lead" heading={2} style={styles.sum} testID="totals">
            {writeTotals(plan)}
          </Txt>
          <Txt color="ink2">{count(plan.totals.wedges, 'wedge', 'wedges')}</Txt>
        </View>
        <View style={wide ? styles.beside : styles.result}>
          <View style={styles.picture}>
            <BlockDrawing plan={plan} size={256} letters />
            <View style={styles.facts}>
              <FactList facts={listFacts(plan)} />
            </View>
          </View>
          <View
            style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}
            testID="fabric-table"
          >
            <FabricTable plan={plan} />
          </View>
        </View>
        <PlanWarnings
          plan={plan}
          onBuy={(letter, yards) => change((draft) => buyFabric(draft, letter, yards))}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  result: { gap: space[4] },
  dimmed: { opacity: 0.55 },
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
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 340,
    borderWidth: border.hair,
    borderRadius: radius.card,
    paddingHorizontal: 14,
    paddingVertical: 8,
  },
});
