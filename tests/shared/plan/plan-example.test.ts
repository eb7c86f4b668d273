import type { PlanStep } from '../../../shared/model/plan';
import type { PlanRequest } from '../../../shared/model/plan-request';
import { planJson } from '../../../shared/plan/canonical-json';
import { defaultRequest } from '../../../shared/plan/default-request';
import { planOf } from '../support/plans';

// The design's own worked plan, typed in from its document: not taken from our output.
const REQUEST =
  '{"kind":"planRequest","version":1,"family":"ring","blocks":1,"block":"16","wedges":16,"seam":"1/4",' +
  '"tip":{"shape":"pointed","seam":"1/4"},"narrowAt":"2","stripHeight":"11/2",' +
  '"centre":{"shape":"circle","fabric":"B","overlap":"1/2","edge":"turned","turning":"1/4"},' +
  '"background":{"fabric":"E","trimAllowance":"1"},"press":"open","applique":"machine",' +
  '"cloth":{"usableWidth":"42","shrinkPercent":"0"},' +
  '"cutting":{"stacking":"oneOfEach","bladeMm":45,"cap":4,"squaringOff":"1/2"},' +
  '"fabrics":[' +
  '{"letter":"A","name":"Sailcloth","role":"wedge","colour":"#EFE5D0","oneWay":false,"dominant":false},' +
  '{"letter":"B","name":"Lantern","role":"wedge","colour":"#E0AC35","oneWay":false,"dominant":false},' +
  '{"letter":"C","name":"Tide","role":"wedge","colour":"#86AAB8","oneWay":false,"dominant":false},' +
  '{"letter":"D","name":"Buoy","role":"wedge","colour":"#B04A37","oneWay":false,"dominant":false},' +
  '{"letter":"E","name":"Fog","role":"background","colour":"#DDE0D8","oneWay":false,"dominant":false}]}';

const GEOMETRY =
  '{"wedge":{"rawNarrowAt":"2","rawWideAt":"15/2","stripHeight":"11/2",' +
  '"cutNarrow":{"exact":1.305445049,"policy":"template"},"cutWide":{"exact":3.49348109,"policy":"template"},' +
  '"pitch":{"exact":2.399463069,"policy":"template"},"perStrip":17,"stripLeft":{"exact":0.115109803,"policy":"template"},' +
  '"outline":[[2,-0.652722524],[7.5,-1.746740545],[7.5,1.746740545],[2,0.652722524]]},' +
  '"ring":{"reach":"29/4","margin":"3/4","marginSeamsOnFolds":{"exact":0.889306717,"policy":"template"},' +
  '"shoulderAt":{"exact":6.047147562,"policy":"template"},"shoulderRadius":{"exact":6.165618187,"policy":"template"},' +
  '"holeCorner":{"exact":2.039182316,"policy":"template"},"order":["A","B","C","D"]},' +
  '"circle":{"finishedRadius":{"exact":2.539182316,"policy":"template"},' +
  '"cutDiameter":{"exact":5.578364633,"cut":"45/8","policy":"upToEighth"},"square":"6"},' +
  '"background":{"cut":"35/2","trim":"33/2"}}';

const plainFabric = (letter: string) =>
  `{"letter":"${letter}","strips":[{"height":"11/2","count":1,"for":"wedge","lengths":1,"length":"12","each":4}],` +
  '"needs":"11/2","buyYards":"1/4","spare":"7/2"}';

const FABRICS =
  `[${plainFabric('A')},` +
  '{"letter":"B","strips":[{"height":"11/2","count":1,"for":"wedge","lengths":1,"length":"12","each":4},' +
  '{"height":"6","count":1,"for":"circle","lengths":1,"length":"6","each":1}],' +
  '"needs":"23/2","buyYards":"3/8","spare":"2"},' +
  `${plainFabric('C')},${plainFabric('D')},` +
  '{"letter":"E","strips":[{"height":"35/2","count":1,"for":"background","lengths":1,"length":"35/2","each":1}],' +
  '"needs":"35/2","buyYards":"1/2","spare":"1/2"}]';

const REST =
  '"totals":{"strips":6,"buyYards":"13/8","wedges":16},' +
  '"stacks":[{"layers":["A","B","C","D"],"count":1,"cutsEach":4,"perCut":4,"pieces":16}],' +
  '"warnings":[{"code":"littleSlack","params":{"fabric":"E","spare":"1/2","offerYards":"5/8"}}]';

const CUT_STEP =
  '{"key":"cut|wedge 16 2 11/2 1/4|wedge","role":"cut","position":4,"station":"table","target":16,' +
  '"title":{"key":"ring.cut.title","params":{"each":4}},"why":{"key":"ring.cut.why","params":{}},' +
  '"lanes":[{"key":"A1+B1+C1+D1","target":4,"consumes":{"stack:A+B+C+D":"1/4"},' +
  '"makes":{"wedge:A":1,"wedge:B":1,"wedge:C":1,"wedge:D":1}}],' +
  '"diagram":"ring.tumbling","settings":null,"cautions":["bladeClosed"],"mistakes":["bentStrip"]}';

const PAIR_STEP =
  '{"key":"pair|wedge 16 2 11/2 1/4 pointed 1/4|wedge","role":"pair","position":8,"station":"machine","target":8,' +
  '"title":{"key":"ring.pair.title","params":{"seam":"1/4"}},"why":{"key":"ring.pair.why","params":{}},' +
  '"lanes":[{"key":"A+B","target":4,"consumes":{"tip:A":1,"tip:B":1},"makes":{"pair:A+B":1}},' +
  '{"key":"C+D","target":4,"consumes":{"tip:C":1,"tip:D":1},"makes":{"pair:C+D":1}}],' +
  '"diagram":"ring.pair","settings":{"stitchMm":"21/10","needle":"80/12","seam":"1/4"},' +
  '"cautions":["needle"],"mistakes":["seamTooWide"]}';

const request = JSON.parse(REQUEST) as PlanRequest;
const plan = planOf(request);
const text = planJson(plan);

describe('the design’s 16-inch plate of 16 wedges from four fabrics', () => {
  it('comes out byte for byte, from request to warnings', () => {
    const start = `{"kind":"plan","version":1,"engine":"1.0.0","request":${REQUEST},"geometry":${GEOMETRY},"fabrics":${FABRICS},${REST},"steps":[`;
    expect(text.slice(0, start.length)).toBe(start);
  });

  it('has the cut and pair steps byte for byte', () => {
    expect(text).toContain(CUT_STEP);
    expect(text).toContain(PAIR_STEP);
  });

  it('is what the defaults give for 16 inches, 16 wedges and those fabrics', () => {
    const { fabrics } = request;
    const choices = {
      block: '16',
      blocks: 1,
      wedges: 16,
      tip: 'pointed',
      centre: 'circle',
    } as const;
    expect(JSON.stringify(defaultRequest({ ...choices, fabrics, circleFabric: 'B' }))).toBe(
      REQUEST,
    );
  });

  it('has every step of the table: role, station, target, uses and makes', () => {
    expect(plan.steps.map(row)).toEqual([
      [1, 'strip', 'table', 4, 'A×1 cloth → strip:A'],
      [2, 'length', 'table', 4, 'A×1 1/3 strip:A → length:A'],
      [3, 'stack', 'table', 1, 'A+B+C+D×1 length:A, length:B, length:C, length:D → stack:A+B+C+D'],
      [
        4,
        'cut',
        'table',
        16,
        'A1+B1+C1+D1×4 1/4 stack:A+B+C+D → wedge:A, wedge:B, wedge:C, wedge:D',
      ],
      [5, 'tip-sew', 'machine', 16, 'A×4 wedge:A → tip-sewn:A'],
      [6, 'tip-trim', 'table', 16, 'A×4 tip-sewn:A → tip-trimmed:A'],
      [7, 'tip-turn', 'iron', 16, 'A×4 tip-trimmed:A → tip:A'],
      [8, 'pair', 'machine', 8, 'A+B×4 tip:A, tip:B → pair:A+B'],
      [9, 'quarter', 'machine', 4, 'A+B+C+D×4 pair:A+B, pair:C+D → quarter:A+B+C+D'],
      [10, 'half', 'machine', 2, 'half×2 2 quarter:A+B+C+D → half'],
      [11, 'ring', 'machine', 1, 'ring×1 2 half → ring'],
      [12, 'ring-press', 'iron', 1, 'ring-pressed×1 ring → ring-pressed'],
      [13, 'circle-cut', 'table', 1, 'B×1 cloth → circle'],
      [14, 'circle-turn', 'iron', 1, 'B×1 circle → circle-ready'],
      [15, 'background-cut', 'table', 1, 'E×1 cloth → background'],
      [16, 'background-fold', 'iron', 1, 'E×1 background → background-folded'],
      [
        17,
        'applique',
        'machine',
        1,
        'plate×1 ring-pressed, circle-ready, background-folded → plate',
      ],
      [18, 'block-trim', 'table', 1, 'block×1 plate → block'],
    ]);
  });

  it('lists a lane for each fabric where a step goes fabric by fabric', () => {
    for (const role of ['strip', 'length', 'tip-sew', 'tip-trim', 'tip-turn']) {
      const step = plan.steps.find((other) => other.role === role);
      expect(step?.lanes.map(({ key }) => key)).toEqual(['A', 'B', 'C', 'D']);
    }
  });

  it('multiplies by three blocks every target but strips, lengths and stacks, which hold whole plates', () => {
    const three = planOf({ ...request, blocks: 3 });
    expect(three.steps.map(({ target }) => target)).toEqual([
      4, 12, 3, 48, 48, 48, 48, 24, 12, 6, 3, 3, 3, 3, 3, 3, 3, 3,
    ]);
  });
});

/** The first lane of a step, as the document's table writes it. */
function row({ position, role, station, target, lanes }: PlanStep) {
  const [lane] = lanes;
  const uses = Object.entries(lane?.consumes ?? {}).map(([item, each]) =>
    each === 1 ? item : `${each} ${item}`,
  );
  const makes = Object.keys(lane?.makes ?? {}).join(', ');
  const text = `${lane?.key}×${lane?.target} ${uses.join(', ') || 'cloth'} → ${makes}`;
  return [position, role, station, target, text];
}
