// Every code that a plan may carry. The texts live in components/*/messages.ts; a test there
// fails when a code has none.

export const STATIONS = ['table', 'machine', 'iron', 'chair', 'wall'] as const;
export type Station = (typeof STATIONS)[number];

/** Kinds of step of the ring family, in their order of work. */
export const STEP_ROLES = [
  'strip',
  'length',
  'stack',
  'cut',
  'tip-sew',
  'tip-trim',
  'tip-turn',
  'pair',
  'quarter',
  'half',
  'ring',
  'ring-press',
  'circle-cut',
  'circle-turn',
  'background-cut',
  'background-fold',
  'stay-stitch',
  'applique',
  'block-trim',
] as const;
export type StepRole = (typeof STEP_ROLES)[number];

/** A step's diagram: `ring.tumbling` for `cut`, `ring.<role>` for every other role. */
export const DIAGRAMS = [
  'ring.strip',
  'ring.length',
  'ring.stack',
  'ring.tumbling',
  'ring.tip-sew',
  'ring.tip-trim',
  'ring.tip-turn',
  'ring.pair',
  'ring.quarter',
  'ring.half',
  'ring.ring',
  'ring.ring-press',
  'ring.circle-cut',
  'ring.circle-turn',
  'ring.background-cut',
  'ring.background-fold',
  'ring.stay-stitch',
  'ring.applique',
  'ring.block-trim',
] as const;
export type Diagram = (typeof DIAGRAMS)[number];

/** Cautions of a step, two at most. Sources: see Me, Safety. */
export const CAUTIONS = [
  'bladeClosed',
  'fingersClear',
  'needle',
  'pinsOut',
  'ironHeel',
  'ironClear',
  'steam',
  'scissors',
  'handNeedle',
] as const;
export type Caution = (typeof CAUTIONS)[number];

/** Common mistakes of a step; the text says how to see each. */
export const MISTAKES = [
  'notSquare',
  'bentStrip',
  'layersSlip',
  'seamTooWide',
  'tipOffCentre',
  'trimTooClose',
  'tipNotTurned',
  'shouldersApart',
  'wrongOrder',
  'ringCups',
  'pressedStretch',
  'circleSmall',
  'foldOff',
  'appliqueOff',
  'trimOffCentre',
  'holeStretched',
] as const;
export type Mistake = (typeof MISTAKES)[number];

/** Warnings of a plan, with their parameters. They never stop a maker. */
export const WARNINGS = [
  'noSlack', // fabric, needs, buyYards, offerYards
  'littleSlack', // fabric, spare, offerYards
  'stripEndShort', // fabric, left: less than 1 in of a strip stays after its last piece
  'anotherStripAt40', // fabric, strips, atForty
  'capExceeded', // layers, cap
  'oneFabric', // fabric: every seam joins like to like
  'neighboursClash', // fabric, wedges: two fabrics and an odd count: two neighbours must match
  'lastWedgeChanged', // fabric, instead: the last wedge breaks the round so that no neighbours match
  // fabrics ("A+B"), count: a plate takes so many more of these than of the others;
  // left ("C+D", or ""), leftEach: wedges of each of those that are cut and left over, in all
  'extraWedges',
  // fabric, axes: it does not lie on every diagonal; 4 or 0 diagonals carry a wedge's axis
  'dominantOffDiagonals',
  'noQuarters', // wedges: not a multiple of four, so the ring is made of halves
  'flapBelowHole', // reaches (a number), hole: the tip's flap shows in the centre hole
  'smallMargin', // margin: the reach is close to the block's edge or over its seam allowance
] as const;
export type WarningCode = (typeof WARNINGS)[number];

/** Reasons to refuse a request; `pointer` names the field, `params` what would work. */
export const REFUSALS = [
  'not-a-request', // the shape of the document itself
  'not-a-length',
  'not-positive',
  'below-least', // least
  'above-most', // most
  'too-few-fabrics', // least
  'too-many-fabrics', // most
  'letter-twice', // letter
  'unknown-fabric', // letter
  'wrong-role', // letter, role
  'two-dominant',
  'margin-negative', // most: the greatest strip height that fits
  'tip-below-hole', // least: the strip height from which the shoulder clears the hole
  'circle-over-tips', // least: the strip height from which the circle leaves the tips free
  'narrow-edge-crossed', // least
  'strip-too-narrow', // least usable width for one wedge
  'background-wider-than-cloth', // least usable width
  'circle-wider-than-cloth', // least usable width
  'shrink-too-large', // most percent
  'buys-too-little', // least yards
] as const;
export type RefusalCode = (typeof REFUSALS)[number];
