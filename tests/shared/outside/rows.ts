/** Where a row's figures come from. */
export type Mark = 'read' | 'derived' | 'memory' | 'common practice';

/** One row of figures that the arithmetic is held against; see the check of the same id. */
interface Row {
  id: string;
  /** what holds, as a sentence's end */
  what: string;
  mark: Mark;
  /** the page or document of a `read` row, else '' */
  source: string;
}

const derived = <Id extends string>(id: Id, what: string) =>
  ({ id, what, mark: 'derived', source: '' }) as const;
const read = <Id extends string>(id: Id, source: string, what: string) =>
  ({ id, what, mark: 'read', source }) as const;
const memory = <Id extends string>(id: Id, what: string) =>
  ({ id, what, mark: 'memory', source: '' }) as const;
const practice = <Id extends string>(id: Id, what: string) =>
  ({ id, what, mark: 'common practice', source: '' }) as const;

// 14-inch block, n = 20, r0 = 2, H = 4¾, a = s = ¼, a circle covers the hole
const WORKED_EXAMPLE = [
  derived('plate14.angle', 'half a wedge of 20 is 9°'),
  derived('plate14.widths', 'a wedge is cut 1.139770 and 2.644423 wide, 1.504652 apart'),
  derived('plate14.pitch', 'wedges tumble 1.892096 apart'),
  derived('plate14.strip-of-42', 'a strip of 42 gives 21 wedges, 1.513649 left'),
  derived('plate14.strip-of-40', 'a strip of 40 gives 20 wedges, 1.405746 left'),
  derived('plate14.one-strip', 'one strip makes a plate, at 42 and at 40'),
  derived('plate14.reach', 'the ring reaches 6½'),
  derived('plate14.seam-line', 'a wedge is 2.058998 wide, finished, on the line of the reach'),
  derived('plate14.shoulder', 'the shoulder is at 5.611263, 0.888737 below the tip'),
  derived('plate14.shoulder-radius', 'the shoulder is 5.681208 from the centre'),
  derived('plate14.folded-width', 'a wedge is 2.214490 wide, raw, where it is folded'),
  derived(
    'plate14.hole-and-circle',
    'the hole’s corners are at 2.024930, the circle’s edge 2.524930',
  ),
  derived('plate14.margin', 'the margin is ½, and 0.580026 with seams on the folds'),
  derived('plate14.area', 'the ring covers 102.865027 square inches'),
  derived('plate14.background', 'the background is cut 15½ and trimmed to 14½'),
  derived('plate14.drift', 'seams 1⁄32 too wide shrink the reach by 0.199764'),
] as const;

const RING = [
  derived('ring.widths-12', 'one of 12 wedges with raw edges at 1 and 9: 1.053536, 5.340724'),
  derived('ring.widths-20', 'one of 20 wedges with raw edges at 1½ and 6: 0.981386, 2.406846'),
  derived('ring.widths-16', 'one of 16 wedges with raw edges at 2 and 8: 1.305445, 3.692393'),
  derived('ring.angles', 'the finished angles of n wedges sum to 360°'),
  derived('ring.flat-area', 'n flat wedges cover the regular polygon ring n·tan θ(R² − r0²)'),
  derived(
    'ring.tip-area',
    'pointed and rounded tips add n·(x·tan θ)², or half circles of that radius',
  ),
  derived('ring.outline', 'a wedge’s outline is clipper-lib’s mitre offset, n = 8 to 24'),
  derived('ring.polygons', 'any convex piece’s raw outline is clipper-lib’s mitre offset'),
  derived('ring.right-angle', 'a pointed tip is a right angle at the reach, for every n'),
  derived('ring.rounded', 'a rounded tip has the same reach'),
  derived('ring.shoulders', 'neighbours’ shoulders meet on the ray between them'),
  derived('ring.below-hole', 'a shoulder that is not beyond the narrow edge is refused'),
  derived('ring.flap', 'few, short wedges have a flap below the narrow edge: a warning'),
  derived('ring.flat-corners', 'a flat ring reaches farthest with its corners, R/cos θ'),
  derived('ring.circle-over-tips', 'a circle that reaches the shoulders is refused'),
  derived('ring.tumbling-run', 'k wedges take c_w + (k − 1)·pitch, k odd or even'),
  derived('ring.one-way', 'wedges of a one-way print take k·c_w'),
  derived('ring.quarters', 'even quarters need n mod 4 = 0'),
  derived('ring.diagonals', 'the diagonals carry an axis when n/4 is odd, a seam when even'),
  derived('ring.never-rounded', 'the two widths of a wedge are never rounded'),
  read('ring.row-drift', 'homeschoolquilting.com', '1⁄32 × 16 seam edges are ½'),
  read('ring.three-strips', 'tamarinis.typepad.com', 'three 2½ strips joined measure 6½'),
  read('ring.wedge-of-20', 'grilledsal, 2012-03', 'a wedge 4¼ high for 20: 2⅜ and 1 are ⅟₃₂ out'),
  read('ring.seam-error', 'catbirdquilts, 2017-02-06', '23 seams each 1⁄16 off are 1 7⁄16'),
] as const;

const STRIPS = [
  memory('strips.usable-width', '42 in of a 44-inch bolt are usable, 40 to be cautious'),
  read('strips.shrink', 'siliconvalleyqfk.org', '3 % are lost in the wash: 97 in need 100'),
  derived('strips.yards', 'cloth is bought by the eighth of a yard: ⌈inches ÷ 4½⌉ ÷ 8'),
  read('strips.of-44', 'harriger.com, inch2yard', '44 ÷ 3½ are 12 a strip; 100 pieces take 9'),
  read('strips.of-42', 'modernquiltingbyb.com', '42 ÷ 4½ are 9 a strip; 140 pieces take 16'),
  derived('strips.squares', 'squares from a strip of 40 and of 42'),
  memory('strips.pre-cuts', 'fat quarter 18 × 22, fat eighth 9 × 22, 2½ strips, 5 and 10 squares'),
  read(
    'strips.joined',
    'crayonboxquiltstudio.com, 2012-04, "What is lost"',
    'a diagonal join loses a strip’s width: 17, 9 and 38½ in',
  ),
  read('strips.sets', 'vickisfabriccreations, 2013-10', '9 strips of 3¼ make 25¼, 16 of 2⅜ 30½'),
  read('strips.set-of-three', 'quiltcentric.com, 2012-09-16', '3 strips of 1½ make 3½'),
  read(
    'strips.fat-quarter',
    'docsbay.net, "Number of squares from a fat quarter"',
    'squares from 18 × 22, 5½ with nothing left',
  ),
  read('strips.from-a-yard', 'quilterscache.com, math charts', 'squares from a yard of 44'),
  read(
    'strips.from-a-yard-slip',
    'quilterscache.com, math charts',
    '7-inch squares from a yard are 30; the chart’s 35 is a slip',
  ),
  read(
    'strips.63-squares',
    'quiltingboard.com post 6228687',
    'four 9½ squares to 42; 63 take 16 widths, 152 in, 4.22 yd: ours 4¼',
  ),
] as const;

const FINISHING = [
  derived('binding.60x80-at-40', '60 × 80 at 2½ from 40: 8 strips, 20 in, ⅝ yd'),
  derived('binding.60x80-at-42', '60 × 80 at 2½ from 42: 7 by the short rule, 8 with joins'),
  derived('binding.50x65-at-40', '50 × 65 at 2¼ from 40: 6 with no slack, 7 with joins, ½ yd'),
  derived('binding.50x65-at-42', '50 × 65 at 2¼ from 42: 6, ¾ in over; 13½ in are ⅜ yd exactly'),
  read('binding.46x46', 'sylviasquiltdepot.com', '46 × 46 at 2½: 4.6, so 5 strips, 12½ in'),
  read('binding.50x60', 'castillejacotton, 2013-06', '50 × 60 at 38 useful inches a strip: 6'),
  derived('binding.bias', 'bias binding 250 × 2 comes from a 23-inch square, before joins'),
  read('binding.bias-610', 'missouriquiltco blog', 'bias binding 244 × 2½ is 610, its root 24.7'),
  derived('borders.48x60', '48 × 60 with a 4-inch border: sides 60½, then 56½; 56 × 68'),
  read(
    'backing.60x80',
    'loghousequilting.com, service page',
    '60 × 80 takes a backing of 68 × 88 and a batting of 66 × 86',
  ),
  read('backing.40x60', 'happy-stitches.com, service page', '40 × 60 takes a backing of 48 × 68'),
  read('backing.60x80-again', 'sewberrychic.com', '60 × 80 takes a backing of 68 × 88'),
  read('backing.60x70', 'cranberryquiltingco.com', '60 × 70 takes a backing of 68 × 78'),
  derived('panels.40x60', 'backing of 40 × 60: two upright 3⅞ yd, two level 2¾'),
  derived('panels.60x80', 'backing of 60 × 80: two upright 5 yd, three level 5¾'),
  memory('batting.packages', 'batting comes 45 × 60, 72 × 90, 81 × 96, 90 × 108, 120 × 120'),
  read('batting.shrink', 'quiltingboard.com post 6723231', '90 in after a loss of 5 % are cut 95'),
  read('beds.batting', 'gnomon.org.uk, bed-sizes', 'the packages that cover each mattress'),
  read('beds.other', 'sleep.org', 'other makers’ mattresses come from the same packages'),
] as const;

const COMMON_PRACTICE = [
  practice(
    'practice.plate-12',
    '12-inch plate of 20 from 4¼ strips, circle 4½, background 13, 12½',
  ),
  practice('practice.plate-18', '18-inch plate of 20 from 6-inch strips, circle 6½'),
  practice('practice.five-fabrics', 'five fabrics give four wedges each'),
  practice('practice.piece', 'a 4¼ × 9½ piece gives at least four wedges a layer'),
  practice('practice.tip-trim', 'the point’s ¼ seam is trimmed to about ⅛'),
  practice('practice.circle-stitch', 'the circle is sewn with stitches of 1.8 mm'),
  practice('practice.stay-stitch', 'an open centre is stay-stitched at 2.0 mm'),
  practice('practice.dominant', 'the dominant fabric lies toward the corners'),
  practice('practice.quarter-seams', 'the quarters’ seams lie on the folds'),
  practice('practice.press-open', 'the ring’s seams are pressed open'),
] as const;

export const ROWS = [
  ...WORKED_EXAMPLE,
  ...RING,
  ...STRIPS,
  ...FINISHING,
  ...COMMON_PRACTICE,
] as const satisfies readonly Row[];

export type RowId = (typeof ROWS)[number]['id'];

/** Checks by the row they hold the product against. */
export type Checks = Partial<Record<RowId, () => void>>;

/** How a row's figures are vouched for, as a test's name says it. */
export function saySource({ mark, source }: Pick<Row, 'mark' | 'source'>): string {
  if (mark === 'read') return `read in ${source}`;
  if (mark === 'derived') return 'derived here';
  return mark === 'memory' ? 'from memory' : 'common practice, no source';
}
