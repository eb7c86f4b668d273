import type { Plan, PlanStep } from '../../../shared/model/plan';
import type { PlanRequest } from '../../../shared/model/plan-request';
import type { StoreTools } from '../../../sync/store/store-tools';

const request: PlanRequest = {
  kind: 'planRequest',
  version: 1,
  family: 'ring',
  blocks: 1,
  block: '16',
  wedges: 16,
  seam: '1/4',
  tip: { shape: 'pointed', seam: '1/4' },
  narrowAt: '2',
  stripHeight: '11/2',
  centre: { shape: 'none', turnUnder: '1/4' },
  background: { fabric: 'E', trimAllowance: '1' },
  press: 'open',
  applique: 'machine',
  cloth: { usableWidth: '42', shrinkPercent: '0' },
  cutting: { stacking: 'oneOfEach', bladeMm: 45, cap: 4, squaringOff: '1/2' },
  fabrics: [],
};

const step = (key: string, position: number, lanes: string[]): PlanStep => ({
  key,
  role: position === 1 ? 'cut' : 'pair',
  position,
  station: position === 1 ? 'table' : 'machine',
  target: 16,
  title: { key: 'ring.cut.title', params: { each: 4 } },
  why: { key: 'ring.cut.why', params: {} },
  lanes: lanes.map((lane) => ({
    key: lane,
    target: 4,
    consumes: { 'stack:A+B': '1/4' },
    makes: { 'wedge:A': 1 },
  })),
  diagram: 'ring.tumbling',
  settings: null,
  cautions: ['bladeClosed'],
  mistakes: [],
});

/** A plan of two steps, typed by hand: the store keeps rows and does not ask what they mean. */
export const handRequest = request;
export const CUT = 'cut|wedge 16 2 11/2 1/4|wedge';
export const PAIR = 'pair|wedge 16 2 11/2 1/4 pointed 1/4|wedge';
const steps = [step(CUT, 1, ['A1+B1+C1+D1']), step(PAIR, 2, ['A+B', 'C+D'])];

export const cutKey = { step: CUT, lane: 'A1+B1+C1+D1', kind: 'done' } as const;
export const pairKey = { step: PAIR, lane: 'A+B', kind: 'done' } as const;
export const otherPairKey = { step: PAIR, lane: 'C+D', kind: 'done' } as const;

function planByHand(from: PlanRequest): Plan {
  const plan = { kind: 'plan', version: 1, engine: '1.0.0', request: from, steps };
  return plan as unknown as Plan;
}

/** Tools with a clock and randomness that a test can foresee. */
export function handTools(nowMs = { value: 1_000_000 }): StoreTools {
  let serial = 0;
  return {
    nowMs: () => nowMs.value,
    random16: async () => {
      const bytes = new Uint8Array(16);
      crypto.getRandomValues(bytes);
      serial += 1;
      bytes[0] = serial;
      return bytes;
    },
    makePlan: (from) =>
      from.wedges < 5
        ? { ok: false, kind: 'refused', errors: [{ code: 'below-least' }] }
        : { ok: true, value: planByHand(from) },
    newIds: async (count) => Array.from({ length: count }, () => `id ${(serial += 1)}`),
    exampleProjects: () => [
      { name: 'Harbour Lights', request, counts: [{ ...cutKey, want: 6 }] },
      { name: 'Pier Runner', request, counts: [] },
    ],
  };
}
