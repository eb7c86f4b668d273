import { UNIT_WORDS, type Words } from '@/components/steps/unit-words';

/** Words for the items that flow between steps, by their kind. */
const ITEM_WORDS: Record<string, Words> = {
  cloth: { one: 'cloth', many: 'cloth', made: 'bought' },
  strip: UNIT_WORDS.strip,
  length: UNIT_WORDS.length,
  stack: UNIT_WORDS.stack,
  wedge: { one: 'wedge', many: 'wedges', made: 'cut' },
  'tip-sewn': { one: 'sewn tip', many: 'sewn tips', made: 'sewn' },
  'tip-trimmed': { one: 'trimmed tip', many: 'trimmed tips', made: 'trimmed' },
  tip: { one: 'turned tip', many: 'turned tips', made: 'turned' },
  pair: UNIT_WORDS.pair,
  quarter: UNIT_WORDS.quarter,
  half: UNIT_WORDS.half,
  ring: { one: 'ring', many: 'rings', made: 'closed' },
  'ring-stayed': { one: 'stay-stitched ring', many: 'stay-stitched rings', made: 'stay-stitched' },
  'ring-pressed': { one: 'pressed ring', many: 'pressed rings', made: 'pressed' },
  circle: { one: 'cut circle', many: 'cut circles', made: 'cut' },
  'circle-ready': { one: 'turned circle', many: 'turned circles', made: 'turned' },
  background: { one: 'cut background', many: 'cut backgrounds', made: 'cut' },
  'background-folded': { one: 'folded background', many: 'folded backgrounds', made: 'folded' },
  plate: { one: 'stitched plate', many: 'stitched plates', made: 'stitched' },
  block: { one: 'block', many: 'blocks', made: 'trimmed' },
};

/** The kind of an item: "wedge" of "wedge:A". */
export function itemKind(item: string): string {
  return item.split(':')[0] ?? item;
}

/** The fabric letters of an item, empty when it has none: "A+C" of "pair:A+C". */
export function itemLetters(item: string): string {
  return item.split(':')[1] ?? '';
}

/** "4 turned tips in A", "1 half": an item with its count. */
export function countItem(item: string, count: number): string {
  const words = ITEM_WORDS[itemKind(item)];
  if (!words) return `${count} × ${item}`;
  const word = count === 1 ? words.one : words.many;
  const letters = itemLetters(item);
  return letters === '' ? `${count} ${word}` : `${count} ${word} in ${letters}`;
}

/** The word for having made an item: "cut" for wedges, "sewn" for pairs. */
export function itemMadeWord(item: string): string {
  return ITEM_WORDS[itemKind(item)]?.made ?? 'made';
}
