import type { StepRole } from '@/shared/model/codes';

export interface Words {
  one: string;
  many: string;
  /** how the work leaves it: "pieces cut" */
  made: string;
}

/** What each kind of step counts, and the word for having made it. */
export const UNIT_WORDS: Record<StepRole, Words> = {
  strip: { one: 'strip', many: 'strips', made: 'cut' },
  length: { one: 'length', many: 'lengths', made: 'cut' },
  stack: { one: 'stack', many: 'stacks', made: 'stacked' },
  cut: { one: 'piece', many: 'pieces', made: 'cut' },
  'tip-sew': { one: 'tip', many: 'tips', made: 'sewn' },
  'tip-trim': { one: 'tip', many: 'tips', made: 'trimmed' },
  'tip-turn': { one: 'tip', many: 'tips', made: 'turned' },
  pair: { one: 'pair', many: 'pairs', made: 'sewn' },
  quarter: { one: 'quarter', many: 'quarters', made: 'sewn' },
  half: { one: 'half', many: 'halves', made: 'sewn' },
  ring: { one: 'ring', many: 'rings', made: 'closed' },
  'ring-press': { one: 'ring', many: 'rings', made: 'pressed' },
  'circle-cut': { one: 'circle', many: 'circles', made: 'cut' },
  'circle-turn': { one: 'circle', many: 'circles', made: 'turned' },
  'background-cut': { one: 'background', many: 'backgrounds', made: 'cut' },
  'background-fold': { one: 'background', many: 'backgrounds', made: 'folded' },
  'stay-stitch': { one: 'ring', many: 'rings', made: 'stay-stitched' },
  applique: { one: 'plate', many: 'plates', made: 'stitched' },
  'block-trim': { one: 'block', many: 'blocks', made: 'trimmed' },
};
