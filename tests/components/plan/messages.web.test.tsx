import { groupWarnings } from '@/components/plan/group-warnings';
import { warningText } from '@/components/plan/messages';
import { refusalText } from '@/components/plan/refusal-texts';
import { REFUSALS, type WarningCode, WARNINGS } from '@/shared/model/codes';
import type { PlanWarning } from '@/shared/model/plan';
import { makePlan } from '@/shared/plan/make-plan';

import { ringRequest } from '../projects/fake-projects-client';

const PARAMS: Record<WarningCode, PlanWarning['params']> = {
  noSlack: { fabric: 'B', needs: '9', buyYards: '1/4', offerYards: '3/8' },
  littleSlack: { fabric: 'A', spare: '1/2', offerYards: '1/4' },
  stripEndShort: { fabric: 'A', left: '1/8' },
  anotherStripAt40: { fabric: 'F', strips: 2, atForty: 3 },
  capExceeded: { layers: 5, cap: 4 },
  oneFabric: { fabric: 'A' },
  neighboursClash: { fabric: 'A', wedges: 21 },
  lastWedgeChanged: { fabric: 'B', instead: 'A' },
  extraWedges: { fabrics: 'A+B', count: 1, left: 'C', leftEach: 2 },
  dominantOffDiagonals: { fabric: 'B', axes: 0 },
  noQuarters: { wedges: 18 },
  flapBelowHole: { reaches: 1.234567891, hole: '3/2' },
  smallMargin: { margin: '1/8' },
};

function planOf(choices = {}) {
  const made = makePlan(ringRequest(choices));
  if (!made.ok) throw new Error('cannot be planned');
  return made.value;
}

describe('warnings', () => {
  it.each(WARNINGS)('has words for %s', (code) => {
    const { title, text } = warningText({ code, params: PARAMS[code] }, planOf());
    for (const words of [title, text]) {
      expect(words).toMatch(/^[A-Z0-9½⅛].*\.$/);
      expect(words).not.toMatch(/undefined|NaN|\[object|null/);
    }
  });

  it('names the fabric and offers the next eighth of a yard', () => {
    expect(warningText({ code: 'noSlack', params: PARAMS.noSlack }, planOf())).toEqual({
      title: 'No slack in Cloth B.',
      text: 'All 9 in of ¼ yd used.',
      offer: { label: 'Buy ⅜ yd', letter: 'B', buyYards: '3/8' },
    });
  });

  it('offers nothing where there is nothing to buy', () => {
    const words = warningText({ code: 'noQuarters', params: PARAMS.noQuarters }, planOf());
    expect(words.offer).toBeUndefined();
  });

  it('tells fabrics that are short by the same in one note with one offer', () => {
    const groups = groupWarnings(planOf());
    expect(groups.map(({ title }) => title)).toEqual([
      '½ in spare in A, C, D and E.',
      'No slack in Cloth B.',
      'No slack in Ground.',
      '3 strips of Ground if the cloth is narrow.',
    ]);
    expect(groups[0]?.offer).toEqual({
      label: 'Buy ¼ yd of each',
      letters: ['A', 'C', 'D', 'E'],
      buyYards: '1/4',
    });
  });
});

describe('refusals', () => {
  it.each(REFUSALS)('says for %s what is wrong, then what works', (code) => {
    const params = { least: '17/4', most: '60', letter: 'B', role: 'wedge' };
    const text = refusalText({ pointer: '/stripHeight', code, params });
    expect(text).toMatch(/^[A-Z].*[.].* .*\.$/);
    expect(text).not.toMatch(/undefined|NaN|17\/4/);
  });

  it.each([
    ['/block', 'below-least', { least: 4 }, 'Too small. Use 4 in or more.'],
    ['/wedges', 'below-least', { least: 5 }, 'Too few. Use 5 or more.'],
    ['/blocks', 'above-most', { most: 200 }, 'Too many. Use 200 or fewer.'],
    ['/block', 'above-most', { most: '60' }, 'Too large. Use 60 in or less.'],
    [
      '/cloth/usableWidth',
      'strip-too-narrow',
      { least: '5/2' },
      'Too narrow for 1 wedge. Use 2½ in or more.',
    ],
    [
      '/stripHeight',
      'circle-over-tips',
      { least: '11/8' },
      'The circle would cover the tips. Use 1⅜ in or more.',
    ],
    [
      '/fabrics/1/buyYards',
      'buys-too-little',
      { least: '3/8' },
      'Too little to cut from. Buy ⅜ yd or more.',
    ],
    [
      '/cloth/shrinkPercent',
      'shrink-too-large',
      { most: '20' },
      'No cloth shrinks that much. Use 20 % or less.',
    ],
  ] as const)('words %s %s', (pointer, code, params, words) => {
    expect(refusalText({ pointer, code, params })).toBe(words);
  });
});
