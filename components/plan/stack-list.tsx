import { StyleSheet, View } from 'react-native';

import { StackPicture } from '@/components/diagrams/stack-picture';
import { count, writeStack } from '@/components/plan/plan-facts';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import type { Plan, PlanStack } from '@/shared/model/plan';

/** The stacks to layer, lightest on top, and that their cuts come to the pieces wanted. */
export function StackList({ plan }: { plan: Plan }) {
  return (
    <View role="list">
      {plan.stacks.map((stack) => (
        <StackRow key={stack.layers.join('+')} plan={plan} stack={stack} />
      ))}
    </View>
  );
}

function StackRow({ plan, stack }: { plan: Plan; stack: PlanStack }) {
  const { color } = useTheme();
  const layers = stack.layers.flatMap((letter) =>
    plan.request.fabrics.filter((fabric) => fabric.letter === letter),
  );
  const pieces = count(stack.pieces, 'piece', 'pieces');
  return (
    <View role="listitem" style={[styles.row, { borderColor: color.line }]}>
      <StackPicture layers={layers} width={120} height={72} />
      <View style={styles.words}>
        <Txt style={styles.title}>{writeStack(stack)}</Txt>
        <Txt>{`${stack.layers.join(', ')} from the top`}</Txt>
        <Txt kind="small" color="ink2">
          {`${stack.count * stack.cutsEach} cuts × ${stack.perCut} = ${pieces}`}
        </Txt>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: 12,
    paddingVertical: 10,
    borderBottomWidth: 1,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 180 },
  title: { fontFamily: font.bold },
});
