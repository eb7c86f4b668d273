import { WARNINGS, type WarningCode } from '../../../shared/model/codes';
import type { PlanRequest } from '../../../shared/model/plan-request';
import { defaultRequest, type RingChoices } from '../../../shared/plan/default-request';
import { choices, fabricsAToZ, planOf } from '../support/plans';

const ask = (changes: Partial<RingChoices>): PlanRequest => defaultRequest(choices(changes));
const centreNone = { centre: 'none' } as const;

type Row = [says: string, request: PlanRequest, code: WarningCode, params: object];

const ROWS: Row[] = [
  [
    'a fabric is used to its last inch',
    ask({ blocks: 5, bladeMm: 60, fabrics: fabricsAToZ(5, 'B') }),
    'noSlack',
    { fabric: 'B', needs: '9', buyYards: '1/4', offerYards: '3/8' },
  ],
  [
    'under an inch of a fabric is over',
    ask({ blocks: 5, bladeMm: 60 }),
    'littleSlack',
    { fabric: 'B', spare: '1/2', offerYards: '1/4' },
  ],
  // backgrounds of 13½: three to 42 leave 1½, three to 41 leave ½
  [
    'under an inch of a strip is over',
    ask({ blocks: 3, usableWidth: '41' }),
    'stripEndShort',
    { fabric: 'F', left: '1/2' },
  ],
  // 25 wedges of 1.614924 under 2.248461 + 24 pitches = 41.006629
  [
    'a whole strip of wedges leaves under an inch',
    ask({ wedges: 20, blocks: 5, fabrics: fabricsAToZ(4) }),
    'stripEndShort',
    { fabric: 'A', left: 0.99337111 },
  ],
  // 42 ÷ 13½ = 3 backgrounds a strip, 40 ÷ 13½ = 2
  [
    'narrow cloth takes another strip',
    ask({ blocks: 5 }),
    'anotherStripAt40',
    { fabric: 'F', strips: 2, atForty: 3 },
  ],
  [
    'her own layers are over the cap',
    ask({ bladeMm: 28, layers: 5 }),
    'capExceeded',
    { layers: 5, cap: 2 },
  ],
  ['every wedge is of one fabric', ask({ fabrics: fabricsAToZ(1) }), 'oneFabric', { fabric: 'A' }],
  [
    'two fabrics share an odd ring',
    ask({ wedges: 15, fabrics: fabricsAToZ(2) }),
    'neighboursClash',
    { fabric: 'A', wedges: 15 },
  ],
  [
    'the last wedge would match the first',
    ask({ wedges: 16 }),
    'lastWedgeChanged',
    { fabric: 'B', instead: 'A' },
  ],
  [
    'a round does not come out even',
    ask({ wedges: 18, fabrics: fabricsAToZ(4) }),
    'extraWedges',
    { fabrics: 'A+B', count: 1, left: 'C+D', leftEach: 1 },
  ],
  [
    'the dominant fabric has no diagonal',
    ask({ wedges: 16, fabrics: fabricsAToZ(4, 'B') }),
    'dominantOffDiagonals',
    { fabric: 'B', axes: 0 },
  ],
  [
    'the dominant fabric shares the diagonals',
    ask({ wedges: 20, fabrics: fabricsAToZ(4, 'B') }),
    'dominantOffDiagonals',
    { fabric: 'B', axes: 4 },
  ],
  ['the wedges make no quarters', ask({ wedges: 18 }), 'noQuarters', { wedges: 18 }],
  // R 3, tan 36° 0.7265425280, cos 0.8090169944: 3 − 2.1796275841 − 0.3090169944
  [
    'few wedges leave a flap in the hole',
    ask({ wedges: 5, narrowAt: '1', stripHeight: '9/4', ...centreNone }),
    'flapBelowHole',
    { reaches: 0.511355422, hole: '1' },
  ],
  [
    'the tips come within a seam of the side',
    ask({ stripHeight: '37/8' }),
    'smallMargin',
    { margin: '1/8' },
  ],
];

describe('a plan warns', () => {
  it.each(ROWS)('when %s', (_says, request, code, params) => {
    const found = planOf(request).warnings.filter((warning) => warning.code === code);
    expect(found.map((warning) => warning.params)).toContainEqual(params);
  });

  it('has a row here for every code', () => {
    expect(new Set(ROWS.map(([, , code]) => code))).toEqual(new Set(WARNINGS));
  });
});

describe('a plan does not warn', () => {
  const codesOf = (request: PlanRequest) => planOf(request).warnings.map(({ code }) => code);

  it('of slack once the offer to buy more is taken', () => {
    const request = ask({ blocks: 5, bladeMm: 60, fabrics: fabricsAToZ(5, 'B') });
    const [warning] = planOf(request).warnings.filter(({ code }) => code === 'noSlack');
    const fabrics = request.fabrics.map((fabric) =>
      fabric.letter === 'B' ? { ...fabric, buyYards: String(warning?.params.offerYards) } : fabric,
    );
    const again = planOf({ ...request, fabrics });
    expect(again.warnings.filter(({ params }) => params.fabric === 'B')).toEqual([]);
    expect(again.fabrics[1]).toMatchObject({ buyYards: '3/8', spare: '9/2' });
  });

  it('of the cap while it splits stacks by itself', () => {
    expect(codesOf(ask({ bladeMm: 18 }))).not.toContain('capExceeded');
  });

  it('of a margin of just one seam', () => {
    expect(codesOf(ask({ stripHeight: '9/2' }))).not.toContain('smallMargin');
  });

  it('of the dominant fabric when it lies on all four diagonals', () => {
    expect(codesOf(ask({ fabrics: fabricsAToZ(5, 'B') }))).not.toContain('dominantOffDiagonals');
  });

  it('of narrow cloth when the cloth is 40 inches already', () => {
    expect(codesOf(ask({ blocks: 5, usableWidth: '40' }))).not.toContain('anotherStripAt40');
  });
});
