import type { Caution, Mistake } from '@/shared/model/codes';

/** One line each: what to do, never more. */
export const CAUTION_TEXTS: Record<Caution, string> = {
  bladeClosed: 'Blade closed when you set it down.',
  fingersClear: 'Fingers clear of the ruler’s edge.',
  needle: 'Fingers clear of the needle’s line.',
  pinsOut: 'Take each pin out before the needle reaches it.',
  ironHeel: 'Iron on its heel, off when you leave.',
  ironClear: 'Keep the iron clear of mat and ruler.',
  steam: 'Steam burns: fingers back from the edge.',
  scissors: 'Scissors closed when you lay them down.',
  handNeedle: 'Park the needle in a cushion. Pick up every pin.',
};

/** What goes wrong, then how to see it and what to do. */
export const MISTAKE_TEXTS: Record<Mistake, string> = {
  notSquare:
    'The end is not square. Lay a ruler line along the fold: if the cut leans away from the edge, square up again before the next strip.',
  bentStrip:
    'A bent strip. Open it out: a V at the fold means the cloth was folded off grain. Refold, square up, cut again.',
  layersSlip:
    'Layers slip. Lift a corner after each cut: if the bottom piece is narrower, stack fewer layers and press the stack first.',
  seamTooWide:
    'The seam is too wide. Measure from the stitches to the raw edge; each wedge loses twice the error and the ring grows small. Move the needle or the guide.',
  tipOffCentre:
    'The tip leans. Fold it on its axis before sewing: both long edges meet. After turning, the seam lies on the middle of the back.',
  trimTooClose:
    'Trimmed too close. Less than ⅛ in left, or threads showing past the stitches: sew that tip again, one needle’s width in.',
  tipNotTurned:
    'A blunt point. Push the corner out with a blunt tool, not with scissors, until both folds run straight to it.',
  shouldersApart:
    'Shoulders apart. Lay the pair flat: the folds should meet in one step-free point. If not, unpick from the folded end and start there.',
  wrongOrder:
    'Out of order. Read the letters clockwise before you sew. A unit turned end for end reads backwards.',
  ringCups:
    'The ring cups or ripples. Lay it on the table before the last seam: a cup means a wedge was cut or sewn tapered. Find the seam that is wide at one end.',
  pressedStretch:
    'Stretched by the iron. Press down and lift, do not slide: the long edges are on the bias. Lay the piece on an uncut one to compare.',
  circleSmall:
    'The circle is too small. Lay it over the hole: it covers every corner with ½ in to spare, all round.',
  foldOff:
    'Folds off centre. Open the background: the two lines cross at the middle, the same distance from all four sides.',
  appliqueOff:
    'The ring sits off the lines. Before stitching, check that the seams lie on the fold lines and the points are the same distance from each side.',
  trimOffCentre:
    'Trimmed off centre. Put the ruler’s middle on the circle’s middle and check all four sides before the first cut.',
  holeStretched:
    'The opening has stretched. Lay the ring flat: a wavy edge stays wavy. Stay-stitch before it is handled, and do not pull.',
};
