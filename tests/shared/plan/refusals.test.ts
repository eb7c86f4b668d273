import { REFUSALS, type RefusalCode } from '../../../shared/model/codes';
import type { PlanRequest } from '../../../shared/model/plan-request';
import { defaultRequest } from '../../../shared/plan/default-request';
import { choices, fabricsAToZ, refusalsOf } from '../support/plans';

const base = defaultRequest(choices({ fabrics: fabricsAToZ(4), wedges: 16, block: '16' }));
const withFabrics = (changes: object[]): PlanRequest => ({
  ...base,
  fabrics: base.fabrics.map((fabric, index) => ({ ...fabric, ...changes[index] })),
});

type Row = [
  says: string,
  request: PlanRequest,
  pointer: string,
  code: RefusalCode,
  params?: object,
];

const ROWS: Row[] = [
  ['a field of the wrong kind', { ...base, blocks: 1.5 }, '/blocks', 'not-a-request'],
  ['a text that is no length', { ...base, block: '12.5 in' }, '/block', 'not-a-length'],
  ['a denominator of nought', { ...base, seam: '1/0' }, '/seam', 'not-a-length'],
  [
    'more digits than cloth has',
    { ...base, seam: `1/${'9'.repeat(400)}` },
    '/seam',
    'not-a-length',
  ],
  ['a negative length', { ...base, stripHeight: '-4' }, '/stripHeight', 'not-positive'],
  ['nought wedges', { ...base, wedges: 0 }, '/wedges', 'not-positive'],
  ['a block under 4 inches', { ...base, block: '31/8' }, '/block', 'below-least', { least: '4' }],
  ['a block over 60 inches', { ...base, block: '61' }, '/block', 'above-most', { most: '60' }],
  ['four wedges', { ...base, wedges: 4 }, '/wedges', 'below-least', { least: 5 }],
  ['61 wedges', { ...base, wedges: 61 }, '/wedges', 'above-most', { most: 60 }],
  ['201 blocks', { ...base, blocks: 201 }, '/blocks', 'above-most', { most: 200 }],
  [
    'no wedge fabric',
    { ...base, fabrics: base.fabrics.slice(4), centre: { shape: 'none', turnUnder: '1/4' } },
    '/fabrics',
    'too-few-fabrics',
    { least: 1 },
  ],
  [
    '13 wedge fabrics',
    { ...base, fabrics: fabricsAToZ(13), background: { ...base.background, fabric: 'N' } },
    '/fabrics',
    'too-many-fabrics',
    { most: 12 },
  ],
  [
    'more fabrics than wedges',
    {
      ...base,
      wedges: 5,
      block: '24',
      stripHeight: '9',
      fabrics: fabricsAToZ(6),
      background: { ...base.background, fabric: 'G' },
    },
    '/fabrics',
    'too-many-fabrics',
    { most: 5 },
  ],
  [
    'one letter for two fabrics',
    withFabrics([{}, {}, { letter: 'B' }]),
    '/fabrics/2/letter',
    'letter-twice',
    { letter: 'B' },
  ],
  [
    'a background that no fabric is',
    { ...base, background: { ...base.background, fabric: 'Z' } },
    '/background/fabric',
    'unknown-fabric',
    { letter: 'Z' },
  ],
  [
    'a circle that no fabric is',
    { ...base, centre: { ...base.centre, fabric: 'Z' } as PlanRequest['centre'] },
    '/centre/fabric',
    'unknown-fabric',
    { letter: 'Z' },
  ],
  [
    'a wedge fabric as background',
    { ...base, background: { ...base.background, fabric: 'A' } },
    '/background/fabric',
    'wrong-role',
    { letter: 'A', role: 'wedge' },
  ],
  [
    'a dominant background',
    withFabrics([{}, {}, {}, {}, { dominant: true }]),
    '/fabrics/4/dominant',
    'wrong-role',
    { letter: 'E', role: 'background' },
  ],
  [
    'two dominant fabrics',
    withFabrics([{ dominant: true }, {}, { dominant: true }]),
    '/fabrics/2/dominant',
    'two-dominant',
    {},
  ],
  // B/2 + e_w − r0 = 8 + ¼ − 2
  [
    'a ring wider than its block',
    { ...base, stripHeight: '51/8' },
    '/stripHeight',
    'margin-negative',
    { most: '25/4' },
  ],
  [
    'a narrow edge beyond the block',
    { ...base, narrowAt: '9' },
    '/narrowAt',
    'above-most',
    { most: '63/8' },
  ],
  // (r0·tan 11.25° + ¼) = 0.6478…, so ¾
  [
    'tips that begin inside an open hole',
    { ...base, stripHeight: '1/2', centre: { shape: 'none', turnUnder: '1/4' } },
    '/stripHeight',
    'tip-below-hole',
    { least: '3/4' },
  ],
  // the figure of the design's own refusal
  [
    'a circle over the tips',
    { ...base, stripHeight: '5/4' },
    '/stripHeight',
    'circle-over-tips',
    { least: '11/8' },
  ],
  [
    'a narrow edge at the very centre',
    { ...base, narrowAt: '1/16' },
    '/narrowAt',
    'narrow-edge-crossed',
    { least: '1/8' },
  ],
  // widest raw edge 3.49348…
  [
    'cloth narrower than one wedge',
    { ...base, cloth: { ...base.cloth, usableWidth: '3' } },
    '/cloth/usableWidth',
    'strip-too-narrow',
    { least: '7/2' },
  ],
  [
    'cloth narrower than the background',
    { ...base, cloth: { ...base.cloth, usableWidth: '17' } },
    '/cloth/usableWidth',
    'background-wider-than-cloth',
    { least: '35/2' },
  ],
  [
    'cloth narrower than the circle',
    { ...base, cloth: { ...base.cloth, usableWidth: '5' } },
    '/cloth/usableWidth',
    'circle-wider-than-cloth',
    { least: '6' },
  ],
  [
    'cloth that shrinks by a fifth and more',
    { ...base, cloth: { ...base.cloth, shrinkPercent: '21' } },
    '/cloth/shrinkPercent',
    'shrink-too-large',
    { most: '20' },
  ],
  [
    'less cloth than the strips take',
    withFabrics([{}, { buyYards: '1/8' }]),
    '/fabrics/1/buyYards',
    'buys-too-little',
    { least: '1/4' },
  ],
];

describe('a request that cannot be planned', () => {
  it.each(ROWS)('refuses %s', (...[, request, pointer, code, params = {}]: Row) => {
    const found = refusalsOf(request).find((error) => error.code === code);
    expect(found).toEqual({ pointer, code, params });
  });

  it('has a row here for every code', () => {
    expect(new Set(ROWS.map(([, , , code]) => code))).toEqual(new Set(REFUSALS));
  });

  it('accepts the strip height that a refusal offers, and not an eighth less', () => {
    for (const [says, request, pointer, code, params] of ROWS) {
      const offered = Object.values(params ?? {})[0];
      if (pointer !== '/stripHeight' || typeof offered !== 'string') continue;
      const codes = refusalsOf({ ...request, stripHeight: offered }).map((error) => error.code);
      expect({ says, refused: codes.includes(code) }).toEqual({ says, refused: false });
    }
    expect(refusalsOf({ ...base, stripHeight: '11/8' })).toEqual([]);
    expect(refusalsOf({ ...base, stripHeight: '25/4' })).toEqual([]);
  });

  it('names every field that is wrong at once', () => {
    const errors = refusalsOf({ ...base, blocks: 0, seam: '0', narrowAt: '-1' });
    expect(errors.map(({ pointer }) => pointer)).toEqual(['/blocks', '/seam', '/narrowAt']);
  });

  it('allows an edge that is fused and not turned', () => {
    const centre = { ...base.centre, edge: 'fused', turning: '0' } as PlanRequest['centre'];
    expect(refusalsOf({ ...base, centre })).toEqual([]);
  });
});
