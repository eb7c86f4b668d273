import type { StepRole } from '@/shared/model/codes';

/** A step's parameter as written in the plan; the plan always carries those its text uses. */
export interface TitleParams {
  inches: (name: string) => string;
  count: (name: string) => number;
  word: (name: string) => string;
}

type TitleText = (params: TitleParams) => string;

export const STEP_TITLES: Record<StepRole, TitleText> = {
  strip: ({ inches }) => `Cut strips ${inches('height')} tall`,
  length: ({ inches }) => `Cut strips into ${inches('length')} lengths`,
  stack: ({ count }) => `Stack ${plural(count('layers'), 'layer', 'layers')}, lightest on top`,
  cut: ({ count }) => `Cut ${plural(count('each'), 'wedge', 'wedges')} from each stack`,
  'tip-sew': () => 'Sew the tips in a chain',
  'tip-trim': ({ inches }) => `Trim the tip seam to ${inches('trimmed')}`,
  'tip-turn': ({ word }) =>
    word('shape') === 'rounded' ? 'Turn the tips over a template' : 'Turn the tips and press them',
  pair: () => 'Chain piece pairs',
  quarter: () => 'Sew pairs into quarters',
  half: () => 'Sew the halves',
  ring: () => 'Dry fit, then close the ring',
  'ring-press': ({ word }) =>
    word('press') === 'side' ? 'Press the ring seams to one side' : 'Press the ring seams open',
  'circle-cut': ({ inches }) => `Cut the circle ${inches('diameter')} across`,
  'circle-turn': ({ inches, word }) =>
    word('edge') === 'fused'
      ? 'Back the circle with fusible web'
      : `Turn the circle’s edge under ${inches('turning')}`,
  'background-cut': ({ inches }) => `Cut the background ${inches('cut')} square`,
  'background-fold': () => 'Fold the background in quarters',
  'stay-stitch': ({ inches }) => `Stay-stitch the opening, just inside ${inches('turnUnder')}`,
  applique: ({ word }) =>
    `Stitch ring ${word('centre') === 'circle' ? 'and circle ' : ''}to the background${word('by') === 'hand' ? ', by hand' : ''}`,
  'block-trim': ({ inches }) => `Trim the block to ${inches('trim')} from its centre`,
};

function plural(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}
