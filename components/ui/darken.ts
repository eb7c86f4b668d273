/**
 * Mixes black into a colour, for a pressed fill.
 *
 * @param hex `#RRGGBB`
 * @param share of black, 0 to 1
 */
export function darken(hex: string, share = 0.12): string {
  const channels = [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16));
  return `#${channels
    .map((channel) =>
      Math.round(channel * (1 - share))
        .toString(16)
        .padStart(2, '0'),
    )
    .join('')}`;
}
