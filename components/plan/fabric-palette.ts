/** A cloth to start from: a name of ours and its colour. */
export interface PaletteCloth {
  name: string;
  colour: string;
}

export const BACKGROUND_CLOTH: PaletteCloth = { name: 'Fog', colour: '#DDE0D8' };

/** Cloths in the order in which new wedge fabrics take them. */
export const PALETTE: readonly PaletteCloth[] = [
  { name: 'Sailcloth', colour: '#EFE5D0' },
  { name: 'Lantern', colour: '#E0AC35' },
  { name: 'Tide', colour: '#86AAB8' },
  { name: 'Buoy', colour: '#B04A37' },
  { name: 'Deep Water', colour: '#263C69' },
  { name: 'Kelp', colour: '#5F6B35' },
  { name: 'Sea Pink', colour: '#D89BA0' },
  { name: 'Rope', colour: '#BFA06B' },
  { name: 'Slate Roof', colour: '#55606E' },
  { name: 'Samphire', colour: '#9DB25A' },
  { name: 'Heather', colour: '#8A6A94' },
  { name: 'Driftwood', colour: '#8C7B6A' },
  { name: 'Ember', colour: '#D2703A' },
  { name: 'Lagoon', colour: '#2F7F86' },
  { name: 'Bramble', colour: '#5B2B47' },
];

/** Every colour that can be chosen, the background's among them. */
export const CLOTH_COLOURS: readonly PaletteCloth[] = [...PALETTE, BACKGROUND_CLOTH];

/** The next cloth whose name and colour are still free; the first again when all are taken. */
export function pickNextCloth(taken: readonly PaletteCloth[]): PaletteCloth {
  const free = PALETTE.find(
    (cloth) => !taken.some(({ name, colour }) => name === cloth.name || colour === cloth.colour),
  );
  return free ?? { name: `Cloth ${taken.length + 1}`, colour: PALETTE[0]?.colour ?? '#EFE5D0' };
}
