import { converter, formatHex, interpolate, wcagContrast } from 'culori';

const toOklch = converter('oklch');
const INKS = ['#2A2017', '#FFFAF0', '#000000', '#FFFFFF'] as const;
const READABLE = 4.5; // WCAG 2.2, text
const LIGHT = 0.72;

/** A letter's ink on a cloth: one of ours where it reads at 4.5:1, else black or white. */
export function letterInk(cloth: string): string {
  return INKS.find((ink) => wcagContrast(ink, cloth) >= READABLE) ?? '#000000';
}

/** The print's colour: the cloth's own hue, darker on a light cloth and lighter on a dark one. */
export function printColour(cloth: string): string {
  const base = toOklch(cloth);
  if (base === undefined) return cloth;
  const by = base.l > LIGHT ? -0.14 : 0.15;
  return formatHex({ ...base, l: base.l + by }).toUpperCase();
}

/** The wrong side of a cloth: mixed with 42 % white. */
export function wrongSide(cloth: string): string {
  return formatHex(interpolate([cloth, '#FFFFFF'], 'rgb')(0.42)).toUpperCase();
}

/** Whether lines on a cloth need a light halo: its letter is light. */
export const isDarkCloth = (cloth: string): boolean => wcagContrast(cloth, '#FFFFFF') > READABLE;
