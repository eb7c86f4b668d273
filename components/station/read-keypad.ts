export type KeypadAnswer =
  | { kind: 'taps'; taps: number }
  | {
      kind: 'between';
      below: { taps: number; pieces: number };
      above: { taps: number; pieces: number };
    }
  | { kind: 'nonsense' };

const MOST_PIECES = 100_000;

/**
 * Reads a count typed in pieces as whole taps of a lane.
 *
 * @param text what was typed
 * @param perTap pieces or units that one tap makes, ≥ 1
 * @returns the taps, or the two nearest counts when no whole number of taps gives the pieces
 * @example readKeypad('62', 5) // between 60 (12 cuts) and 65 (13 cuts)
 */
export function readKeypad(text: string, perTap: number): KeypadAnswer {
  const trimmed = text.trim();
  if (!/^\d+$/.test(trimmed)) return { kind: 'nonsense' };
  const pieces = Number(trimmed);
  if (pieces > MOST_PIECES) return { kind: 'nonsense' };
  if (pieces % perTap === 0) return { kind: 'taps', taps: pieces / perTap };
  const taps = Math.floor(pieces / perTap);
  return {
    kind: 'between',
    below: { taps, pieces: taps * perTap },
    above: { taps: taps + 1, pieces: (taps + 1) * perTap },
  };
}
