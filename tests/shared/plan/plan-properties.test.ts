import * as fc from 'fast-check';

import type { Plan } from '../../../shared/model/plan';
import { PlanRefusalSchema, PlanSchema } from '../../../shared/model/plan';
import type { PlanRequest } from '../../../shared/model/plan-request';
import { planJson } from '../../../shared/plan/canonical-json';
import { makePlan } from '../../../shared/plan/make-plan';
import { ringLetters } from '../../../shared/patterns/ring/ring-letters';
import { toFraction } from '../../../shared/units/fraction';
import { brokenRequestArbitrary, requestArbitrary } from '../support/arbitrary-request';

const RUNS = { numRuns: 150, seed: 20 };

const answers = new Map<string, ReturnType<typeof makePlan>>();

/** Every property draws the same requests: plan each of them once. */
function planOnce(request: PlanRequest) {
  const text = JSON.stringify(request);
  const answer = answers.get(text) ?? makePlan(request);
  answers.set(text, answer);
  return answer;
}

/** Runs a check over plans only, and fails when too few requests could be planned. */
function everyPlan(check: (plan: Plan) => void): void {
  let planned = 0;
  fc.assert(
    fc.property(requestArbitrary, (request) => {
      const answer = planOnce(request);
      if (!answer.ok) return;
      planned += 1;
      check(answer.value);
    }),
    RUNS,
  );
  expect(planned).toBeGreaterThan(RUNS.numRuns / 4);
}

/** What the lanes of a plan make and use of every item, all taps done. */
function flowOf(plan: Plan) {
  const made = new Map<string, number>();
  const used = new Map<string, number>();
  for (const { target, makes, consumes } of plan.steps.flatMap(({ lanes }) => lanes)) {
    for (const [item, each] of Object.entries(makes)) {
      made.set(item, (made.get(item) ?? 0) + each * target);
    }
    for (const [item, each] of Object.entries(consumes)) {
      const before = toFraction(String(used.get(item) ?? 0));
      used.set(item, before.add(toFraction(String(each)).mul(target)).valueOf());
    }
  }
  return { made, used };
}

const CLOTH_ITEM = /^(strip|length|stack):/;

describe('any request within the limits', () => {
  it('is planned or refused, and either answer keeps its schema', () => {
    fc.assert(
      fc.property(requestArbitrary, (request) => {
        const answer = makePlan(request);
        if (answer.ok) expect(PlanSchema.parse(answer.value)).toEqual(answer.value);
        else for (const error of answer.errors) PlanRefusalSchema.parse(error);
        return answer.ok || answer.errors.length > 0;
      }),
      RUNS,
    );
  });

  it('gives the same text twice, also from its own text', () => {
    everyPlan((plan) => {
      const again = makePlan(JSON.parse(JSON.stringify(plan.request)) as PlanRequest);
      expect(again.ok && planJson(again.value)).toBe(planJson(plan));
    });
  });

  it('makes every item that it uses', () => {
    everyPlan((plan) => {
      const { made, used } = flowOf(plan);
      for (const [item, amount] of used) expect(made.get(item) ?? 0).toBeGreaterThanOrEqual(amount);
    });
  });

  it('uses up every unit it makes, but for named wedges left of a round and the rest of cloth', () => {
    everyPlan((plan) => {
      const { made, used } = flowOf(plan);
      const extra = plan.warnings.find(({ code }) => code === 'extraWedges')?.params;
      const left = String(extra?.left ?? '').split('+');
      for (const [item, amount] of made) {
        if (item === 'block') continue;
        const over = amount - (used.get(item) ?? 0);
        if (CLOTH_ITEM.test(item)) expect(over).toBeLessThan(1);
        else if (item.startsWith('wedge:')) {
          expect(over).toBe(left.includes(item.slice(6)) ? extra?.leftEach : 0);
        } else expect({ item, over }).toEqual({ item, over: 0 });
      }
    });
  });

  it('makes as many blocks as are asked for', () => {
    everyPlan((plan) => {
      expect(flowOf(plan).made.get('block')).toBe(plan.request.blocks);
    });
  });

  it('cuts stacks × cuts × layers = pieces, in all as many as the cut step counts', () => {
    everyPlan((plan) => {
      for (const { count, cutsEach, perCut, pieces, layers } of plan.stacks) {
        expect(count * cutsEach * perCut).toBe(pieces);
        expect(layers).toHaveLength(perCut);
      }
      const cut = plan.steps.find(({ role }) => role === 'cut');
      expect(plan.stacks.reduce((sum, { pieces }) => sum + pieces, 0)).toBe(cut?.target);
      expect(plan.totals.wedges).toBe(cut?.target);
    });
  });

  it('sews n wedges into every plate, fabric by fabric as they stand around the ring', () => {
    everyPlan((plan) => {
      const { wedges, blocks, tip } = plan.request;
      const { used } = flowOf(plan);
      const letters = ringLetters(plan.geometry.ring.order, wedges);
      const kind = tip.shape === 'flat' ? 'wedge' : 'tip';
      for (const letter of plan.geometry.ring.order) {
        const around = letters.filter((other) => other === letter).length;
        expect(used.get(`${kind}:${letter}`)).toBe(around * blocks);
      }
    });
  });

  it('buys cloth that covers its strips, and strips that hold their lengths', () => {
    everyPlan((plan) => {
      const usable = toFraction(plan.request.cloth.usableWidth);
      for (const { strips, needs, buyYards, spare } of plan.fabrics) {
        const along = strips.reduce(
          (sum, { height, count }) => sum.add(toFraction(height).mul(count)),
          toFraction('0'),
        );
        expect(along.equals(needs)).toBe(true);
        expect(toFraction(buyYards).mul(36).gte(needs)).toBe(true);
        expect(toFraction(spare).gte(0)).toBe(true);
        for (const { count, lengths, length } of strips) {
          expect(lengths).toBeLessThanOrEqual(count * usable.div(length).floor().valueOf());
        }
      }
    });
  });

  it('keeps the wedges of a fabric at its fewest strips', () => {
    everyPlan((plan) => {
      const { perStrip } = plan.geometry.wedge;
      for (const { letter, strips } of plan.fabrics) {
        const wedge = strips.find((strip) => strip.for === 'wedge');
        const fabric = plan.request.fabrics.find((other) => other.letter === letter);
        if (!wedge || fabric?.oneWay) continue;
        const pieces = flowOf(plan).made.get(`wedge:${letter}`) ?? 0;
        expect(wedge.count).toBe(Math.ceil(pieces / perStrip));
      }
    });
  });

  it('keeps every stack within the layers asked for', () => {
    everyPlan(({ request, stacks }) => {
      const depth = request.cutting.layers ?? request.cutting.cap;
      expect(Math.max(...stacks.map(({ perCut }) => perCut))).toBeLessThanOrEqual(depth);
    });
  });

  it('numbers its steps in order, each key once, each lane key once in its step', () => {
    everyPlan(({ steps }) => {
      expect(steps.map(({ position }) => position)).toEqual(steps.map((_, index) => index + 1));
      expect(new Set(steps.map(({ key }) => key)).size).toBe(steps.length);
      for (const { lanes } of steps) {
        expect(lanes.length).toBeGreaterThan(0);
        expect(new Set(lanes.map(({ key }) => key)).size).toBe(lanes.length);
        for (const { target } of lanes) expect(target).toBeGreaterThan(0);
      }
    });
  });
});

describe('nonsense', () => {
  it('is refused, never thrown at', () => {
    fc.assert(
      fc.property(brokenRequestArbitrary, (request) => {
        const answer = makePlan(request as PlanRequest);
        return answer.ok || answer.errors.every(({ pointer }) => /^(\/|$)/.test(pointer));
      }),
      RUNS,
    );
    for (const nothing of [null, undefined, 0, '', [], {}, { kind: 'planRequest' }]) {
      expect(makePlan(nothing as unknown as PlanRequest).ok).toBe(false);
    }
  });
});
