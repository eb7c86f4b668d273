import {
  IDLE_INPUT,
  readTallyInput,
  type TallyInputEvent,
} from '@/components/station/tally-input-machine';

/** The effects of a run of events, those without one left out. */
function effects(events: readonly TallyInputEvent[]): string[] {
  let state = IDLE_INPUT;
  const found: string[] = [];
  for (const event of events) {
    const step = readTallyInput(state, event);
    state = step.state;
    if (step.effect) found.push(step.effect);
  }
  return found;
}

const began = (atMs: number): TallyInputEvent => ({ type: 'touch-began', atMs });
const ended = (atMs: number): TallyInputEvent => ({ type: 'touch-ended', atMs });
const down = (key: string, atMs: number, repeat = false): TallyInputEvent => ({
  type: 'key-down',
  key,
  repeat,
  atMs,
});
const up = (key: string): TallyInputEvent => ({ type: 'key-up', key });

describe('touches', () => {
  it('count when they are let go', () => {
    expect(effects([began(0)])).toEqual([]);
    expect(effects([began(0), ended(60)])).toEqual(['count']);
  });

  it('are one when they begin within 80 ms: a hand’s side covers two places', () => {
    expect(effects([began(0), began(79), ended(300), ended(310)])).toEqual(['count']);
    expect(effects([began(0), ended(30), began(79), ended(400)])).toEqual(['count']);
  });

  it('are two when the second begins at 80 ms and is let go late enough', () => {
    expect(effects([began(0), ended(30), began(80), ended(210)])).toEqual(['count', 'count']);
  });

  it('count again from 180 ms after a count on', () => {
    expect(effects([began(0), ended(10), began(100), ended(189)])).toEqual(['count']);
    expect(effects([began(0), ended(10), began(100), ended(190)])).toEqual(['count', 'count']);
  });

  it('open the keypad when they are long, and do not count then', () => {
    expect(effects([began(0), { type: 'long-press' }, ended(700)])).toEqual(['keypad']);
  });

  it('do not count when they are called off', () => {
    expect(effects([began(0), { type: 'touch-cancelled' }, ended(50)])).toEqual([]);
  });

  it('do not count when they never began', () => {
    expect(effects([ended(50)])).toEqual([]);
  });
});

describe('keys', () => {
  it('count with Space, Enter, Page Down and the right arrow, and with no other', () => {
    for (const key of [' ', 'Enter', 'PageDown', 'ArrowRight']) {
      expect(effects([down(key, 0)])).toEqual(['count']);
    }
    for (const key of ['a', 'Tab', 'ArrowLeft', 'PageUp', 'Escape']) {
      expect(effects([down(key, 0)])).toEqual([]);
    }
  });

  it('count once while they are held', () => {
    expect(effects([down(' ', 0), down(' ', 500, true), down(' ', 900)])).toEqual(['count']);
    expect(effects([down(' ', 0), up(' '), down(' ', 500)])).toEqual(['count', 'count']);
  });

  it('count again once the window was left, where a key’s release is lost', () => {
    expect(effects([down(' ', 0), { type: 'keys-released' }, down(' ', 500)])).toEqual([
      'count',
      'count',
    ]);
  });

  it('share the 180 ms with touches', () => {
    expect(effects([began(0), ended(10), down('Enter', 150)])).toEqual(['count']);
    expect(effects([began(0), ended(10), down('Enter', 190)])).toEqual(['count', 'count']);
  });

  it('take back with Backspace, at any time, once while it is held', () => {
    expect(effects([down(' ', 0), down('Backspace', 20), down('Backspace', 60, true)])).toEqual([
      'count',
      'undo',
    ]);
  });
});
