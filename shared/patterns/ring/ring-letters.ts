/**
 * The fabric of every wedge, clockwise from 12 o'clock: wedge j has the (j mod m)th of the round.
 * With n ≡ 1 (mod m) the last wedge would match the first; it takes the first fabric that matches
 * neither neighbour. With two fabrics there is none, and the clash stays.
 *
 * @param order letters of one round
 * @param wedgeCount wedges in the full ring
 * @example ringLetters(['A', 'B', 'C', 'D'], 5) // A B C D B
 */
export function ringLetters(order: readonly string[], wedgeCount: number): string[] {
  const letters = Array.from({ length: wedgeCount }, (_, j) => order[j % order.length] ?? '');
  const last = letters.at(-1);
  if (last !== letters[0]) return letters;
  const neighbours = [letters[0], letters.at(-2)];
  const instead = order.find((letter) => !neighbours.includes(letter));
  return instead === undefined ? letters : [...letters.slice(0, -1), instead];
}
