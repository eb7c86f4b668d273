import type { PlanRequest } from '../../../shared/model/plan-request';
import { planJson } from '../../../shared/plan/canonical-json';
import { defaultRequest, type RingChoices } from '../../../shared/plan/default-request';
import { parseRequest } from '../../../shared/plan/parse-request';
import { toFraction, toText } from '../../../shared/units/fraction';
import { choices, fabricsAToZ, planOf, refusalsOf } from '../support/plans';

const ask = (changes: Partial<RingChoices>): PlanRequest => defaultRequest(choices(changes));
const codesOf = (request: PlanRequest) => refusalsOf(request).map(({ code }) => code);

/** What a refusal of the strip height says would work. */
function advice(request: PlanRequest, code: string, kind: 'least' | 'most'): string {
  const refusal = refusalsOf(request).find((each) => each.code === code);
  expect(refusal?.pointer).toBe('/stripHeight');
  return String(Object.entries(refusal?.params ?? {}).find(([name]) => name === kind)?.[1]);
}

const byAnEighth = (height: string, eighths: 1 | -1) =>
  toText(toFraction(height).add(toFraction('1/8').mul(eighths)));

describe('what is just allowed', () => {
  it.each([
    ['five wedges', ask({ wedges: 5 })],
    ['sixty wedges', ask({ wedges: 60 })],
    ['two hundred blocks', ask({ blocks: 200 })],
    ['twelve wedge fabrics', ask({ fabrics: fabricsAToZ(12) })],
    ['a fabric for every wedge', ask({ wedges: 5, fabrics: fabricsAToZ(5) })],
    ['a block of 4', ask({ block: '4' })],
    ['a block of 60, on cloth of 200', ask({ block: '60', usableWidth: '200' })],
    ['sixteen layers', ask({ cap: 16, layers: 16 })],
    ['seams of 1', ask({ block: '30', seam: '1', tipTurning: '1' })],
    ['4 inches for squaring', ask({ squaringOff: '4' })],
    ['12 inches to trim', ask({ trimAllowance: '12' })],
    ['a loss of a fifth', ask({ shrinkPercent: '20' })],
    ['a narrow edge at ⅛', ask({ narrowAt: '1/8' })],
  ])('%s', (_says, request) => {
    expect(refusalsOf(request)).toEqual([]);
  });
});

describe('the strip height that a refusal offers', () => {
  const COUNTS = [5, 6, 8, 13, 20, 60];
  const TIPS = ['pointed', 'rounded', 'flat'] as const;

  it('is the least that leaves the tips free of the circle', () => {
    for (const wedges of COUNTS) {
      for (const tip of TIPS) {
        const short = ask({ block: '30', wedges, tip, narrowAt: '3', stripHeight: '1/2' });
        const least = advice(short, 'circle-over-tips', 'least');
        expect(refusalsOf({ ...short, stripHeight: least })).toEqual([]);
        const less = { ...short, stripHeight: byAnEighth(least, -1) };
        expect(codesOf(less)).toEqual(['circle-over-tips']);
      }
    }
  });

  it('is the least that leaves the tips beyond an open hole', () => {
    for (const wedges of COUNTS) {
      const centre = 'none';
      const short = ask({ block: '30', wedges, centre, narrowAt: '3', stripHeight: '1/4' });
      const least = advice(short, 'tip-below-hole', 'least');
      expect(refusalsOf({ ...short, stripHeight: least })).toEqual([]);
      const less = { ...short, stripHeight: byAnEighth(least, -1) };
      expect(codesOf(less)).toEqual(['tip-below-hole']);
    }
  });

  it('is the most that keeps the ring on its block', () => {
    for (const block of ['12', '37/3', '61/5']) {
      for (const tip of TIPS) {
        const tall = ask({ block, tip, stripHeight: '9' });
        const most = advice(tall, 'margin-negative', 'most');
        expect(refusalsOf({ ...tall, stripHeight: most })).toEqual([]);
        const more = { ...tall, stripHeight: byAnEighth(most, 1) };
        expect(codesOf(more)).toEqual(['margin-negative']);
      }
    }
  });
});

describe('the one text of a plan', () => {
  /** The same with the keys of every object the other way round. */
  function turned(value: unknown): unknown {
    if (Array.isArray(value)) return value.map(turned);
    if (typeof value !== 'object' || value === null) return value;
    const entries = Object.entries(value).reverse();
    return Object.fromEntries(entries.map(([key, inner]) => [key, turned(inner)]));
  }

  it('has its keys in the schema’s order, however they came', () => {
    const plan = planOf(ask({}));
    // not of its lanes: they name their items freely, in the plan's own order
    const shuffled = { ...plan };
    Object.assign(shuffled, { geometry: turned(plan.geometry), totals: turned(plan.totals) });
    expect(JSON.stringify(shuffled)).not.toBe(planJson(plan));
    expect(planJson(shuffled)).toBe(planJson(plan));
  });

  /** Every length of a request over a denominator twice as large. */
  function doubled(value: unknown): unknown {
    if (Array.isArray(value)) return value.map(doubled);
    if (typeof value === 'string' && /^\d+(\/\d+)?$/.test(value)) {
      const [numerator, denominator = '1'] = value.split('/');
      return `${2 * Number(numerator)}/${2 * Number(denominator)}`;
    }
    if (typeof value !== 'object' || value === null) return value;
    return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, doubled(inner)]));
  }

  it.each([
    ['a pointed tip and a circle', { tip: 'pointed', centre: 'circle' }],
    ['a rounded tip and an open centre', { tip: 'rounded', centre: 'none' }],
  ] as const)('is the same for lengths not in lowest terms, with %s', (_says, shapes) => {
    const request = ask({ ...shapes, shrinkPercent: '3', stripHeight: '31/8', narrowAt: '3/2' });
    const fabrics = request.fabrics.map((fabric) => ({ ...fabric, buyYards: '3/2' }));
    const asked = { ...request, fabrics };
    const parsed = parseRequest(doubled(asked));
    expect(parsed).toEqual({ ok: true, value: asked });
    if (parsed.ok) expect(planJson(planOf(parsed.value))).toBe(planJson(planOf(asked)));
  });
});
