/** Touches that begin within this time are one: the side of a hand covers two places. */
export const TOGETHER_MS = 80;
/** After a count the next one counts from this time on. */
export const NEXT_COUNT_MS = 180;

const COUNT_KEYS: readonly string[] = [' ', 'Enter', 'PageDown', 'ArrowRight'];
const UNDO_KEY = 'Backspace';

export interface TallyInputState {
  touchBeganAtMs: number | null;
  /** the touch has counted, opened the keypad or been called off */
  touchSpent: boolean;
  countedAtMs: number | null;
  heldKeys: readonly string[];
}

export type TallyInputEvent =
  | { type: 'touch-began'; atMs: number }
  | { type: 'touch-ended'; atMs: number }
  | { type: 'touch-cancelled' }
  | { type: 'long-press' }
  | { type: 'key-down'; key: string; repeat: boolean; atMs: number }
  | { type: 'key-up'; key: string }
  | { type: 'keys-released' };

export type TallyInputEffect = 'count' | 'undo' | 'keypad' | null;

export interface TallyInputStep {
  state: TallyInputState;
  effect: TallyInputEffect;
}

export const IDLE_INPUT: TallyInputState = {
  touchBeganAtMs: null,
  touchSpent: true,
  countedAtMs: null,
  heldKeys: [],
};

/** Whether a key counts or takes back at a station. */
export function isTallyKey(key: string): boolean {
  return COUNT_KEYS.includes(key) || key === UNDO_KEY;
}

/**
 * Says what one touch or key does to the count, and remembers what the next needs.
 *
 * @param state what earlier touches and keys left behind
 * @param event what happened, times in milliseconds of one steady clock
 * @returns the new state, and the one effect of the event
 */
export function readTallyInput(state: TallyInputState, event: TallyInputEvent): TallyInputStep {
  switch (event.type) {
    case 'touch-began':
      return { state: beginTouch(state, event.atMs), effect: null };
    case 'touch-ended':
      return endTouch(state, event.atMs);
    case 'touch-cancelled':
      return { state: { ...state, touchSpent: true }, effect: null };
    case 'long-press':
      if (state.touchSpent) return { state, effect: null };
      return { state: { ...state, touchSpent: true }, effect: 'keypad' };
    case 'key-down':
      return pressKey(state, event);
    case 'key-up':
      return { state: { ...state, heldKeys: without(state.heldKeys, event.key) }, effect: null };
    case 'keys-released':
      return { state: { ...state, heldKeys: [] }, effect: null };
  }
}

function beginTouch(state: TallyInputState, atMs: number): TallyInputState {
  const { touchBeganAtMs } = state;
  if (touchBeganAtMs !== null && atMs - touchBeganAtMs < TOGETHER_MS) return state;
  return { ...state, touchBeganAtMs: atMs, touchSpent: false };
}

function endTouch(state: TallyInputState, atMs: number): TallyInputStep {
  if (state.touchSpent) return { state, effect: null };
  return countAt({ ...state, touchSpent: true }, atMs);
}

function pressKey(
  state: TallyInputState,
  event: { key: string; repeat: boolean; atMs: number },
): TallyInputStep {
  if (!isTallyKey(event.key)) return { state, effect: null };
  if (event.repeat || state.heldKeys.includes(event.key)) return { state, effect: null };
  const held = { ...state, heldKeys: [...state.heldKeys, event.key] };
  if (event.key === UNDO_KEY) return { state: held, effect: 'undo' };
  return countAt(held, event.atMs);
}

function countAt(state: TallyInputState, atMs: number): TallyInputStep {
  const { countedAtMs } = state;
  if (countedAtMs !== null && atMs - countedAtMs < NEXT_COUNT_MS) return { state, effect: null };
  return { state: { ...state, countedAtMs: atMs }, effect: 'count' };
}

function without(keys: readonly string[], key: string): readonly string[] {
  return keys.filter((held) => held !== key);
}
