import { act, type ReactElement } from 'react';
import { createRoot } from 'react-dom/client';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
import { StepDiagram } from '@/components/diagrams/step-diagram';
import { DIAGRAMS } from '@/shared/model/codes';
import type { Plan, PlanStep } from '@/shared/model/plan';
import { fabricsFor, ringPlan } from '../../support/ring-plan';

(globalThis as { IS_REACT_ACT_ENVIRONMENT?: boolean }).IS_REACT_ACT_ENVIRONMENT = true;

/** What the browser is given: every element with all its attributes. */
function markupOf(element: ReactElement): string {
  const host = document.createElement('div');
  const root = createRoot(host);
  act(() => root.render(element));
  const { innerHTML } = host;
  act(() => root.unmount());
  return innerHTML;
}

const BROKEN = /NaN|Infinity|undefined|\[object/;
const TIPS = ['pointed', 'rounded', 'flat'] as const;
const CENTRES = ['circle', 'none'] as const;
const RINGS = [
  { wedges: 5, block: '16', stripHeight: '9/2', fabrics: fabricsFor(2) },
  { wedges: 8, block: '16', fabrics: fabricsFor(3) },
  { wedges: 20, block: '12', blocks: 5, fabrics: fabricsFor(5) },
  { wedges: 60, block: '24', fabrics: fabricsFor(12) },
];

/** A step of the plan with this diagram, or any other that is made to carry it. */
function stepWith(plan: Plan, diagram: PlanStep['diagram']): PlanStep {
  const own = plan.steps.find((step) => step.diagram === diagram);
  const any = plan.steps[0];
  if (own) return own;
  if (!any) throw new Error('a plan has steps');
  return { ...any, diagram, lanes: [] };
}

function draw(plan: Plan, diagram: PlanStep['diagram'], done: number, leftHanded = false): string {
  const step = stepWith(plan, diagram);
  const lane = step.lanes[0] ?? null;
  return markupOf(
    <StepDiagram
      plan={plan}
      step={step}
      lane={lane}
      done={done}
      width={364}
      height={150}
      leftHanded={leftHanded}
    />,
  );
}

describe.each(TIPS)('with a %s tip', (tip) => {
  describe.each(CENTRES)('and centre %s', (centre) => {
    it.each(RINGS)('draws every diagram of $wedges wedges without a broken number', (ring) => {
      const plan = ringPlan({ tip, centre, ...ring });
      for (const diagram of DIAGRAMS) {
        const svg = draw(plan, diagram, 1);
        expect(svg).toContain('<svg');
        expect({ diagram, broken: BROKEN.exec(svg)?.[0] }).toEqual({ diagram, broken: undefined });
      }
      expect(markupOf(<BlockDrawing plan={plan} size={256} />)).not.toMatch(BROKEN);
    });
  });
});

describe('StepDiagram', () => {
  const plan = ringPlan();

  it('is a picture named by its sentence', () => {
    expect(draw(plan, 'ring.block-trim', 0)).toContain(
      'aria-label="The block trimmed to 16½ in: 8¼ in each way from its centre."',
    );
  });

  it('checks what is cut and numbers what comes next', () => {
    const numbers = (svg: string) =>
      [...svg.matchAll(/<text[^>]*>(\d)<\/text>/g)].map((found) => found[1]);
    expect(numbers(draw(plan, 'ring.tumbling', 0))).toEqual(['1', '2', '3', '4']);
    expect(numbers(draw(plan, 'ring.tumbling', 2))).toEqual(['3', '4']);
    expect(numbers(draw(plan, 'ring.tumbling', 4))).toEqual([]);
  });

  it('mirrors the cut for a left hand', () => {
    expect(draw(plan, 'ring.tumbling', 1, true)).not.toBe(draw(plan, 'ring.tumbling', 1));
    expect(draw(plan, 'ring.tumbling', 1, true)).not.toMatch(BROKEN);
  });

  it('holds a very low and a very high picture', () => {
    const step = stepWith(plan, 'ring.tumbling');
    for (const height of [40, 700]) {
      const svg = markupOf(
        <StepDiagram plan={plan} step={step} lane={null} done={0} width={320} height={height} />,
      );
      expect(svg).not.toMatch(BROKEN);
    }
  });

  it('uses no style sheet, so that a strict content policy lets it through', () => {
    expect(draw(plan, 'ring.pair', 0)).not.toContain('<style');
  });
});
