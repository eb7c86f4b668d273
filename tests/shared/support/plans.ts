import type { Plan } from '../../../shared/model/plan';
import type { PlanRequest, RequestFabric } from '../../../shared/model/plan-request';
import { defaultRequest, type RingChoices } from '../../../shared/plan/default-request';
import { makePlan } from '../../../shared/plan/make-plan';

const COLOURS = ['#EFE5D0', '#E0AC35', '#86AAB8', '#B04A37', '#263C69', '#DDE0D8'];

/** Fabrics A, B, … for wedges, and one more for the background. */
export function fabricsAToZ(wedgeFabrics: number, dominant?: string): RequestFabric[] {
  return Array.from({ length: wedgeFabrics + 1 }, (_, index) => {
    const letter = String.fromCharCode(65 + index);
    return {
      letter,
      name: `Cloth ${letter}`,
      role: index < wedgeFabrics ? 'wedge' : 'background',
      colour: COLOURS[index % COLOURS.length] ?? '#000000',
      oneWay: false,
      dominant: letter === dominant,
    };
  });
}

export function choices(changes: Partial<RingChoices> = {}): RingChoices {
  return {
    block: '12',
    blocks: 1,
    wedges: 20,
    tip: 'pointed',
    centre: 'circle',
    fabrics: fabricsAToZ(5),
    ...changes,
  };
}

export function planOf(request: PlanRequest): Plan {
  const planned = makePlan(request);
  if (!planned.ok) throw new Error(JSON.stringify(planned.errors));
  return planned.value;
}

/** Five 12-inch plates of 20 wedges from A–E (B dominant), background F, 60 mm blade. */
export function fivePlates(): Plan {
  return planOf(defaultRequest(choices({ blocks: 5, bladeMm: 60, fabrics: fabricsAToZ(5, 'B') })));
}

/** The refusals of a request as "pointer code". */
export function refusalsOf(
  request: PlanRequest,
): { pointer: string; code: string; params: object }[] {
  const planned = makePlan(request);
  return planned.ok ? [] : planned.errors;
}
