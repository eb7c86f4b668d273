import * as fc from 'fast-check';

import type { FractionText } from '../../../shared/model/length';
import type { PlanRequest, RequestFabric } from '../../../shared/model/plan-request';
import { defaultRequest } from '../../../shared/plan/default-request';

const eighths = (least: number, most: number): fc.Arbitrary<FractionText> =>
  fc.integer({ min: least, max: most }).map((count) => `${count}/8`);

const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });

function fabricsArbitrary(): fc.Arbitrary<RequestFabric[]> {
  const colour = fc.integer({ min: 0, max: 0xffffff });
  const cloth = fc.record({ colour, oneWay: fc.boolean() });
  return fc
    .tuple(fc.array(cloth, { minLength: 1, maxLength: 12 }), cloth, fc.integer({ min: 0, max: 13 }))
    .map(([wedges, background, dominantAt]) =>
      [...wedges, background].map((each, index) => ({
        letter: String.fromCharCode(65 + index),
        name: `Cloth ${index}`,
        role: index < wedges.length ? 'wedge' : 'background',
        colour: `#${each.colour.toString(16).padStart(6, '0').toUpperCase()}`,
        oneWay: each.oneWay,
        dominant: index === dominantAt && index < wedges.length,
      })),
    );
}

/** Requests as a form might send them: within the limits of their fields, mostly plannable. */
export const requestArbitrary: fc.Arbitrary<PlanRequest> = fc
  .record({
    block: eighths(32, 320),
    blocks: fc.integer({ min: 1, max: 200 }),
    wedges: fc.integer({ min: 5, max: 60 }),
    tip: fc.constantFrom('pointed', 'rounded', 'flat'),
    centre: fc.constantFrom('circle', 'none'),
    fabrics: fabricsArbitrary(),
    circleEdge: fc.constantFrom('turned', 'fused'),
    bladeMm: fc.constantFrom(18, 28, 45, 60),
    cap: maybe(fc.integer({ min: 1, max: 16 })),
    layers: maybe(fc.integer({ min: 1, max: 16 })),
    narrowAt: maybe(eighths(1, 40)),
    stripHeight: maybe(eighths(4, 120)),
    seam: maybe(eighths(1, 4)),
    usableWidth: maybe(eighths(280, 880)),
    shrinkPercent: maybe(eighths(0, 80)),
    squaringOff: maybe(eighths(0, 12)),
    press: fc.constantFrom('open', 'side'),
    applique: fc.constantFrom('machine', 'hand'),
  } as const)
  .map((choices) => defaultRequest(choices));

/** The same with one part of it replaced by anything at all. */
export const brokenRequestArbitrary: fc.Arbitrary<unknown> = fc
  .tuple(requestArbitrary, fc.anything(), fc.nat())
  .map(([request, anything, at]) => {
    const keys = Object.keys(request);
    return { ...request, [keys[at % keys.length] ?? 'block']: anything };
  });
