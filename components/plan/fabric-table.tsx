import type { ReactNode } from 'react';
import { type StyleProp, StyleSheet, View, type ViewStyle } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { Swatch } from '@/components/ui/swatch';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Plan, PlanFabric } from '@/shared/model/plan';
import type { RequestFabric } from '@/shared/model/plan-request';
import { formatInches, formatYards } from '@/shared/units/format-fraction';

/** What to buy: per fabric the strips, the inches they need, the cloth to buy and what is spare. */
export function FabricTable({ plan }: { plan: Plan }) {
  const { color } = useTheme();
  const without = plan.warnings.flatMap(({ code, params }) =>
    code === 'noSlack' ? [String(params.fabric)] : [],
  );
  return (
    <View role="table" aria-label="Fabrics">
      <View role="rowgroup">
        <View role="row" style={[styles.row, styles.head, { borderColor: color.line }]}>
          <Head style={styles.fabric}>Fabric</Head>
          <Head style={styles.strips}>Strips</Head>
          <Head style={styles.needs}>Needs</Head>
          <Head style={styles.buy}>Buy</Head>
          <Head style={styles.spare}>Spare</Head>
        </View>
      </View>
      <View role="rowgroup">
        {plan.fabrics.map((fabric) => (
          <Row
            key={fabric.letter}
            fabric={fabric}
            cloth={plan.request.fabrics.find(({ letter }) => letter === fabric.letter)}
            noSlack={without.includes(fabric.letter)}
          />
        ))}
      </View>
    </View>
  );
}

function Head({ children, style }: { children: string; style: object }) {
  return (
    <View role="columnheader" style={style}>
      <Txt kind="label" color="ink2" align={style === styles.fabric ? 'left' : 'right'}>
        {children}
      </Txt>
    </View>
  );
}

function Cell({ children, style }: { children: ReactNode; style: StyleProp<ViewStyle> }) {
  return (
    <View role="cell" style={[styles.cell, style]}>
      {children}
    </View>
  );
}

interface RowProps {
  fabric: PlanFabric;
  cloth: RequestFabric | undefined;
  noSlack: boolean;
}

function Row({ fabric, cloth, noSlack }: RowProps) {
  const { color } = useTheme();
  const tint = noSlack ? { backgroundColor: color.weldTint } : null;
  const strips = fabric.strips.reduce((sum, strip) => sum + strip.count, 0);
  return (
    <View role="row" style={[styles.row, { borderColor: color.line }, tint]}>
      <View role="rowheader" style={[styles.cell, styles.fabric, styles.named]}>
        {cloth ? <Swatch fabric={cloth} size={34} /> : null}
        <Txt style={styles.name} numberOfLines={2}>
          {cloth?.name ?? fabric.letter}
        </Txt>
        {cloth?.dominant ? <Icon name="star" size={18} color="weldInk" label="Dominant" /> : null}
      </View>
      <Cell style={styles.strips}>
        <Txt align="right">{strips}</Txt>
      </Cell>
      <Cell style={styles.needs}>
        <Txt align="right">{formatInches(fabric.needs)}</Txt>
      </Cell>
      <Cell style={styles.buy}>
        <Txt align="right" style={styles.bold}>
          {formatYards(fabric.buyYards)}
        </Txt>
      </Cell>
      <Cell style={[styles.spare, styles.spared]}>
        {noSlack ? <Icon name="triangle" size={18} color="weldInk" label="No slack" /> : null}
        <Txt align="right" color={noSlack ? 'weldInk' : 'ink'} style={noSlack && styles.bold}>
          {formatInches(fabric.spare)}
        </Txt>
      </Cell>
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 6,
    minHeight: 44,
    paddingVertical: 4,
    borderBottomWidth: 1,
  },
  head: { minHeight: 33 },
  cell: { justifyContent: 'center' },
  fabric: { flex: 1, minWidth: 0 },
  named: { flexDirection: 'row', alignItems: 'center', justifyContent: 'flex-start', gap: 8 },
  name: { flexShrink: 1 },
  strips: { width: 44 },
  needs: { width: 58 },
  buy: { width: 58 },
  spare: { width: 62 },
  spared: { flexDirection: 'row', alignItems: 'center', justifyContent: 'flex-end', gap: 4 },
  bold: { fontFamily: font.bold },
});
