import type { Plan } from '../../shared/model/plan';
import type { RequestFabric } from '../../shared/model/plan-request';
import { defaultRequest, type RingChoices } from '../../shared/plan/default-request';
import { makePlan } from '../../shared/plan/make-plan';

const COLOURS = ['#EFE5D0', '#E0AC35', '#86AAB8', '#B04A37', '#263C69', '#7A8F4A'];

/** Wedge fabrics A, B, C … and a background Z. */
export function fabricsFor(count: number): RequestFabric[] {
  const wedge = Array.from({ length: count }, (_, i): RequestFabric => {
    const letter = String.fromCharCode(65 + i);
    const colour = COLOURS[i % COLOURS.length] ?? '#808080';
    return {
      letter,
      name: `Cloth ${letter}`,
      role: 'wedge',
      colour,
      oneWay: false,
      dominant: false,
    };
  });
  const ground = { letter: 'Z', name: 'Ground', colour: '#DDE0D8' };
  return [...wedge, { ...ground, role: 'background', oneWay: false, dominant: false }];
}

/** A plan for drawing; by default the 16 in plate of 16 wedges from four fabrics. */
export function ringPlan(choices: Partial<RingChoices> = {}): Plan {
  const made = makePlan(
    defaultRequest({
      block: '16',
      blocks: 1,
      wedges: 16,
      tip: 'pointed',
      centre: 'circle',
      fabrics: fabricsFor(4),
      ...choices,
    }),
  );
  if (!made.ok) throw new Error(JSON.stringify(made.errors));
  return made.value;
}
