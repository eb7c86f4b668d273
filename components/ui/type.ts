import type { TextStyle } from 'react-native';

/**
 * Family stacks. A weight is a family of its own (expo-font knows no weights), and the second name
 * holds the Latin Extended letters that the first lacks.
 */
const fallback = 'system-ui, "Segoe UI", Verdana, sans-serif';
export const font = {
  body: `Atkinson500, Atkinson500Ext, ${fallback}`,
  strong: `Atkinson600, Atkinson600Ext, ${fallback}`,
  bold: `Atkinson700, Atkinson700Ext, ${fallback}`,
  title: 'YoungSerif400, YoungSerif400Ext, "Iowan Old Style", Georgia, serif',
} as const;

export type TextKind =
  'body' | 'small' | 'label' | 'lead' | 'display' | 'section' | 'step' | 'count' | 'nav' | 'header';

export interface TypeStyle {
  /** px at 100 % text */
  size: number;
  /** px from 900 px of width on, where it differs */
  wideSize?: number;
  /** line height as a multiple of the size */
  line: number;
  family: string;
  /** letter spacing as a multiple of the size */
  tracking?: number;
}

export const type: Record<TextKind, TypeStyle> = {
  body: { size: 16, line: 1.35, family: font.body },
  small: { size: 15, line: 1.35, family: font.body },
  label: { size: 14, line: 1.2, family: font.strong },
  lead: { size: 18, line: 1.3, family: font.bold },
  display: { size: 30, wideSize: 36, line: 1.15, family: font.title, tracking: -0.005 },
  section: { size: 19, line: 1.2, family: font.title, tracking: -0.005 },
  step: { size: 24.5, wideSize: 36, line: 1.15, family: font.title, tracking: -0.005 },
  count: { size: 33, wideSize: 40, line: 1, family: font.bold, tracking: -0.02 },
  nav: { size: 13.5, line: 1.2, family: font.strong },
  header: { size: 13, line: 1.1, family: font.strong },
};

/** Tabular, lining numerals, so that a count does not jog as it grows. */
export const numerals: TextStyle = { fontVariant: ['tabular-nums', 'lining-nums'] };

/**
 * A text style at a text scale. What a place asks for on top (`own`) grows with the text too, and
 * keeps the style's proportion of line to size unless it brings its own.
 *
 * @param scale 1 at 100 % text
 * @param wide from 900 px of width on
 */
export function textMetrics(
  style: TypeStyle,
  scale: number,
  wide: boolean,
  own: TextStyle = {},
): TextStyle & { fontSize: number } {
  const fontSize = (own.fontSize ?? (wide ? style.wideSize : undefined) ?? style.size) * scale;
  const lineHeight = own.lineHeight === undefined ? fontSize * style.line : own.lineHeight * scale;
  return {
    fontFamily: style.family,
    letterSpacing: (style.tracking ?? 0) * fontSize,
    ...own,
    fontSize,
    lineHeight: Math.round(lineHeight * 100) / 100,
  };
}
