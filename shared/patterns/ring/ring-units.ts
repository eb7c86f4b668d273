/** A unit of a ring: its kind and the letters of its wedges in ring order. */
export interface RingUnit {
  kind: 'single' | 'pair' | 'quarter' | 'half' | 'ring';
  letters: string[];
  /** what it is sewn from; empty for a single wedge */
  parts: RingUnit[];
}

/**
 * The ring as a tree of units. A part is a quarter if n mod 4 = 0, else a half (⌈n/2⌉, ⌊n/2⌋). Its
 * k wedges make ⌊k/2⌋ pairs in ring order; an odd k also leaves one single, in the middle place
 * when ⌊k/2⌋ is even, else last. A part of one unit is that unit: nothing is sewn.
 *
 * @param letters the fabric of every wedge, clockwise from 12 o'clock
 */
export function ringUnits(letters: readonly string[]): RingUnit {
  const half = Math.ceil(letters.length / 2);
  const halves = [letters.slice(0, half), letters.slice(half)].map((side) =>
    letters.length % 4 === 0
      ? join('half', [
          joinPairs('quarter', side.slice(0, half / 2)),
          joinPairs('quarter', side.slice(half / 2)),
        ])
      : joinPairs('half', side),
  );
  return join('ring', halves);
}

function joinPairs(kind: RingUnit['kind'], letters: readonly string[]): RingUnit {
  const pairs = Math.floor(letters.length / 2);
  const singleAt = letters.length % 2 === 0 ? -1 : pairs % 2 === 0 ? pairs : letters.length - 1;
  const parts: RingUnit[] = [];
  for (let index = 0; index < letters.length;) {
    const size = index === singleAt ? 1 : 2;
    const own = letters.slice(index, index + size);
    const singles = own.map((letter): RingUnit => single(letter));
    parts.push(size === 1 ? single(own[0] ?? '') : join('pair', singles));
    index += size;
  }
  return join(kind, parts);
}

function single(letter: string): RingUnit {
  return { kind: 'single', letters: [letter], parts: [] };
}

function join(kind: RingUnit['kind'], parts: RingUnit[]): RingUnit {
  const [only] = parts;
  if (only && parts.length === 1) return only;
  return { kind, letters: parts.flatMap((part) => part.letters), parts };
}
