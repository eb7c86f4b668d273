/** A tick of a ruler bar: where it stands and, on a long one, its number. */
export interface RulerMark {
  at: number;
  long: boolean;
  label: string | null;
}

const MOST_TICKS = 48;

/**
 * Ticks of a ruler bar from 0 to `of`: one a cut, a long one with its number a stack. Where they
 * would run together short ticks go first, then numbers are thinned out; 0 and `of` always stay.
 *
 * @param of target, ≥ 1
 * @param tick units between short ticks, > 0
 * @param longTick units between long ticks; without it each tick is long
 * @param mostNumbers about how many numbers there is room for
 */
export function rulerMarks(
  of: number,
  tick: number,
  longTick = tick,
  mostNumbers = 7,
): RulerMark[] {
  if (!(of > 0) || !(tick > 0) || !(longTick > 0)) return [];
  const longStep = longTick * Math.ceil(of / longTick / mostNumbers);
  const shortStep = of / tick > MOST_TICKS ? longStep : tick;
  const places = new Set([0, of]);
  for (let at = shortStep; at < of; at += shortStep) places.add(at);
  for (let at = longStep; at < of; at += longStep) places.add(at);
  return [...places]
    .sort((a, b) => a - b)
    .map((at) => {
      const end = at === 0 || at === of;
      const numbered = end || (at % longStep === 0 && of - at >= longStep / 2);
      return { at, long: end || at % longStep === 0, label: numbered ? String(at) : null };
    });
}
