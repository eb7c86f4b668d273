import type { RefusalCode } from '@/shared/model/codes';
import type { PlanRefusal } from '@/shared/model/plan';
import { formatFraction } from '@/shared/units/format-fraction';

const COUNTED = ['/blocks', '/wedges', '/cutting/cap', '/cutting/layers', '/fabrics'];
const FRACTION = /^-?\d+(\/[1-9]\d*)?$/;

function number(value: string | number | undefined): string {
  if (typeof value === 'number') return String(Math.round(value * 1000) / 1000);
  if (value === undefined) return '';
  return FRACTION.test(value) ? formatFraction(value) : value;
}

function unitOf(pointer: string): string {
  if (COUNTED.includes(pointer)) return '';
  if (pointer.endsWith('/shrinkPercent')) return ' %';
  return pointer.endsWith('/buyYards') ? ' yd' : ' in';
}

/** "Use 4 in or more." and its like, from the parameters that say what would work. */
function whatWorks({ pointer, params }: PlanRefusal): string {
  const unit = unitOf(pointer);
  const fewer = unit === '' ? 'fewer' : 'less';
  const { least, most } = params;
  if (least !== undefined && most !== undefined)
    return `Use ${number(least)} to ${number(most)}${unit}.`;
  if (least !== undefined) return `Use ${number(least)}${unit} or more.`;
  return most === undefined ? 'Try another size.' : `Use ${number(most)}${unit} or ${fewer}.`;
}

type Wording = string | ((refusal: PlanRefusal) => string);
const then = (wrong: string) => (refusal: PlanRefusal) => `${wrong} ${whatWorks(refusal)}`;
const isCount = ({ pointer }: PlanRefusal) => unitOf(pointer) === '';

/** What is wrong, then what works. */
export const REFUSAL_TEXTS: Record<RefusalCode, Wording> = {
  'not-a-request': 'This cannot be planned as it stands. Enter it again.',
  'not-a-length': 'Not a length. Write 4 1/4, 4¼ or 4.25.',
  'not-positive': 'Nothing would be left. Use more than 0.',
  'below-least': (e) => `${isCount(e) ? 'Too few.' : 'Too small.'} ${whatWorks(e)}`,
  'above-most': (e) => `${isCount(e) ? 'Too many.' : 'Too large.'} ${whatWorks(e)}`,
  'too-few-fabrics': ({ params }) => `Too few fabrics. Add ${number(params.least ?? 1)} or more.`,
  'too-many-fabrics': ({ params }) => `Too many fabrics. Use ${number(params.most)} or fewer.`,
  'letter-twice': ({ params }) => `Letter ${params.letter} is there twice. Use each letter once.`,
  'unknown-fabric': ({ params }) => `There is no fabric ${params.letter}. Choose one of the list.`,
  'wrong-role': ({ params }) => `Fabric ${params.letter} is for something else. Choose another.`,
  'two-dominant': 'Two fabrics are dominant. Keep one.',
  'margin-negative': then('The plate is wider than its block.'),
  'tip-below-hole': then('The tips would begin inside the hole.'),
  'circle-over-tips': then('The circle would cover the tips.'),
  'narrow-edge-crossed': then('The wedge comes to a point before its narrow edge.'),
  'strip-too-narrow': then('Too narrow for 1 wedge.'),
  'background-wider-than-cloth': then('The cloth is narrower than the background.'),
  'circle-wider-than-cloth': then('The cloth is narrower than the circle.'),
  'shrink-too-large': then('No cloth shrinks that much.'),
  'buys-too-little': ({ params }) =>
    `Too little to cut from. Buy ${number(params.least)} yd or more.`,
};

/** A refusal in words, for the line beside its field. */
export function refusalText(refusal: PlanRefusal): string {
  const text = REFUSAL_TEXTS[refusal.code];
  return typeof text === 'string' ? text : text(refusal);
}

const TYPING_TEXTS = {
  'not-a-length': 'Not a length. Write 4 1/4, 4¼ or 4.25.',
  'not-positive': 'Nothing would be left. Use more than 0.',
  'not-a-count': 'Not a whole number. Write 5 or 20.',
  'not-a-percentage': 'Not a number. Write 3 or 2.5.',
  'no-name': 'No name yet. One word is enough.',
} as const;
export type TypingFault = keyof typeof TYPING_TEXTS;

/** What is wrong with a text as it was typed. */
export function typingText(fault: TypingFault): string {
  return TYPING_TEXTS[fault];
}
