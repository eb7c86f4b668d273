/** A run of plain text, or a fraction that the font has no single sign for. */
export type TextRun =
  | { kind: 'text'; text: string }
  | { kind: 'fraction'; over: string; under: string; mixed: boolean };

const EIGHTHS: Record<string, string> = { '⅛': '1', '⅜': '3', '⅝': '5', '⅞': '7' };
const FRACTION = /([⅛⅜⅝⅞])|(\d+)⁄(\d+)/gu;

/**
 * Splits a text at its eighths and n⁄d fractions (U+2044). `mixed`: a whole number stands before
 * it, so that "1⅝" is not read as 15/8. A space between the two is taken out: the built fraction
 * brings its own.
 */
export function splitFractions(text: string): TextRun[] {
  const runs: TextRun[] = [];
  let from = 0;
  for (const match of text.matchAll(FRACTION)) {
    const before = text.slice(from, match.index);
    const mixed = /\d ?$/.test(before);
    const plain = mixed ? before.trimEnd() : before;
    if (plain) runs.push({ kind: 'text', text: plain });
    const [, sign, over = '', under = ''] = match;
    runs.push(
      sign
        ? { kind: 'fraction', over: EIGHTHS[sign] ?? '', under: '8', mixed }
        : { kind: 'fraction', over, under, mixed },
    );
    from = match.index + match[0].length;
  }
  if (from < text.length || runs.length === 0) runs.push({ kind: 'text', text: text.slice(from) });
  return runs;
}

const PARTS: Record<string, [one: string, many: string]> = {
  '2': ['half', 'halves'],
  '3': ['third', 'thirds'],
  '4': ['quarter', 'quarters'],
  '8': ['eighth', 'eighths'],
  '16': ['sixteenth', 'sixteenths'],
  '32': ['thirty-second', 'thirty-seconds'],
  '64': ['sixty-fourth', 'sixty-fourths'],
};

/** How a fraction is read out: "5 eighths", "and 5 eighths" after a whole number. */
export function readFraction(over: string, under: string, mixed: boolean): string {
  const [one, many] = PARTS[under] ?? [`over ${under}`, `over ${under}`];
  return `${mixed ? 'and ' : ''}${over} ${over === '1' ? one : many}`;
}
