import { group } from '../group.mjs';

const CUTTING = group(
  'cutting',
  ['tests/shared/cutting', 'tests/shared/outside'],
  [
    ['find-replacement', '.gte(height)', '.lte(height)'],
    ['find-replacement', 'left.gte(needed)', 'left.gt(usable)'],
    ['last-strip-left', '(count - 1) * piecesPerStrip', 'count * piecesPerStrip'],
    ['find-replacement', 'along.lte(fabric.spare)', 'along.gt(fabric.spare)'],
    ['pieces-per-strip', '.floor()', '.ceil()'],
    ['plan-fabric', '.sub(needs)', '.add(needs)'],
    ['plan-fabric', '.mul(count)', '.add(count)'],
    [
      'square-strips',
      'piecesPerStrip(usableWidth, side)',
      'piecesPerStrip(usableWidth, side.div(2))',
    ],
    ['squares-from-piece', ') * piecesPerStrip', ') + piecesPerStrip'],
    ['strip-run', '(wedges - 1)', 'wedges'],
    ['strips-for-count', 'Math.ceil', 'Math.floor'],
    ['strips-for-count', 'perStrip < 1', 'perStrip < 0'],
    ['wedge-lengths', 'total - each * (cut.lengths - 1)', 'total - each * cut.lengths + 1'],
    ['wedge-lengths', ') + squaringOff.valueOf()', ') - squaringOff.valueOf()'],
    ['wedge-lengths', 'plates <= blocks &&', 'plates < blocks &&'],
    ['wedge-pitch', '(cutNarrowIn + cutWideIn) / 2', '(cutNarrowIn + cutWideIn) / 4'],
    ['wedges-per-strip', 'TOLERANCE) + 1', 'TOLERANCE)'],
    ['wedges-per-strip', 'Math.floor', 'Math.ceil'],
    ['yards-to-buy', 'needIn.div(', 'needIn.mul('],
    ['yards-to-buy', '.mul(36)', '.mul(35)'],
  ],
);

const UNITS = group(
  'units',
  ['tests/shared/units', 'tests/shared/outside'],
  [
    ['format-fraction', '.sub(whole)', '.add(whole)'],
    ['format-fraction', "'3/8': '⅜'", "'3/8': '⅝'"],
    ['format-fraction', 'places = 2', 'places = 3'],
    ['fraction', 'value.toFraction()', 'value.toFraction(true)'],
    ['keep-nine-decimals', '1e9 + 0', '1e9'],
    ['keep-nine-decimals', 'Math.round', 'Math.floor'],
    ['nearest-sixteenth', 'Math.round', 'Math.ceil'],
    ['parse-length', '.add(whole)', '.sub(whole)'],
    ['parse-length', 'negative || value.equals(0)', 'value.equals(0)'],
    ['up-to-eighth-yard', "= '9/2'", "= '9/4'"],
    ['up-to-eighth-yard', '.ceil()', '.round()'],
    ['down-to-eighth', 'exact.mul(8).floor()', 'exact.mul(8).ceil()'],
    ['up-to-eighth', 'exact.mul(partsPerInch).ceil()', 'exact.mul(partsPerInch).floor()'],
    ['up-to-eighth', 'upToPart(exactIn, 8)', 'upToPart(exactIn, 4)'],
  ],
);

const FINISHING = group(
  'finishing',
  ['tests/shared/finishing', 'tests/shared/outside'],
  [
    ['backing-panels', 'across.sub(LOST_PER_JOIN)', 'across'],
    ['backing-panels', "run === 'upright'", "run !== 'upright'"],
    ['batting-package', 'needed.lte(side)', 'needed.lt(side)'],
    ['batting-package', 'width.lte(height)', 'width.gte(height)'],
    ['bias-square-side', 'Math.ceil', 'Math.floor'],
    ['binding-cloth', '.sub(length)', '.add(length)'],
    ['binding-cloth', 'width.mul(strips)', 'width.mul(strips - 1)'],
    ['binding-length', '.mul(2)', '.mul(4)'],
    ['binding-strips-unjoined', '.ceil()', '.floor()'],
    ['binding-strips', 'usableWidth.sub(width)', 'usableWidth.add(width)'],
    ['binding-strips', '.ceil()', '.floor()'],
    ['border-lengths', '.sub(seam.mul(4))', '.sub(seam.mul(2))'],
    ['border-lengths', 'sides: top.height', 'sides: top.width'],
    ['joined-strips', 'strips - 1', 'strips'],
    ['joined-width', '2 * (pieces - 1)', '2 * pieces'],
    ['with-overhang', 'width: width.add(overhang.mul(2))', 'width: width.add(overhang)'],
  ],
);

export const CLOTH = [...CUTTING, ...UNITS, ...FINISHING];
