import { TSpan } from 'react-native-svg';

const EIGHTHS: Record<string, [string, string]> = {
  '⅛': ['1', '8'],
  '⅜': ['3', '8'],
  '⅝': ['5', '8'],
  '⅞': ['7', '8'],
  '⅓': ['1', '3'],
  '⅔': ['2', '3'],
};
const SPLIT = /([⅛⅜⅝⅞⅓⅔]|\d+⁄\d+)/;
const PART = 0.64;
const RAISED = 0.32;

/**
 * Text of an SVG label with its fractions built: the font has no eighths, and "1 5/8" set flat
 * could be read as 15/8. Numerator and denominator are 64 %, the numerator raised.
 */
export function FractionSpans({ text, px }: { text: string; px: number }) {
  if (!SPLIT.test(text)) return text;
  return text.split(SPLIT).map((part, index) => {
    const [top, bottom] = EIGHTHS[part] ?? part.split('⁄');
    if (top === undefined || bottom === undefined) return <TSpan key={index}>{part}</TSpan>;
    return [
      <TSpan key={`${index}-top`} fontSize={px * PART} dy={-px * RAISED}>
        {top}
      </TSpan>,
      <TSpan key={`${index}-bar`} fontSize={px * PART} dy={px * RAISED}>
        ⁄
      </TSpan>,
      <TSpan key={`${index}-bottom`} fontSize={px * PART}>
        {bottom}
      </TSpan>,
    ];
  });
}
