import { useState, type ComponentType } from 'react';
import { type LayoutChangeEvent, StyleSheet, View } from 'react-native';
import Svg from 'react-native-svg';

import { describeStep } from '@/components/diagrams/describe-step';
import { PaintDefs, usePaints } from '@/components/diagrams/parts/paints';
import type { Scene } from '@/components/diagrams/parts/scene';
import { DRAWINGS } from '@/components/diagrams/drawings';
import { radius, useTheme } from '@/components/ui/theme';
import { ringShape } from '@/shared/geometry/drawing/ring-shape';
import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';

interface Props {
  plan: Plan;
  step: PlanStep;
  /** the lane that is counted; null: the step as a whole */
  lane: PlanLane | null;
  /** taps done in that lane */
  done: number;
  height: number;
  /** measured from the page when it is left out */
  width?: number;
  leftHanded?: boolean;
}

/** What to do at a step, drawn in true proportion from the plan's geometry. */
export function StepDiagram({ plan, step, lane, done, height, width, leftHanded = false }: Props) {
  const { color } = useTheme();
  const [measured, setMeasured] = useState(0);
  const paints = usePaints(plan.request.fabrics);
  const across = width ?? measured;
  const onLayout = (event: LayoutChangeEvent) => setMeasured(event.nativeEvent.layout.width);
  const Drawing: ComponentType<Scene> = DRAWINGS[step.diagram];
  const scene: Scene = {
    plan,
    shape: ringShape(plan),
    step,
    lane,
    done: Math.max(0, done),
    box: { x: 0, y: 0, width: across, height },
    leftHanded,
    paints,
  };
  return (
    <View
      accessible
      role="img"
      aria-label={describeStep(plan, step, lane, done)}
      onLayout={width === undefined ? onLayout : undefined}
      style={[
        styles.frame,
        { height, backgroundColor: color.card, borderColor: color.line },
        width === undefined ? null : { width },
      ]}
    >
      {across > 0 && (
        <Svg width={across} height={height}>
          <PaintDefs paints={paints} />
          <Drawing {...scene} />
        </Svg>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { borderRadius: radius.card, borderWidth: 1, overflow: 'hidden', minWidth: 0 },
});
