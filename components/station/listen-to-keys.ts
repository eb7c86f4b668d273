import { isTallyKey, type TallyInputEvent } from '@/components/station/tally-input-machine';

const CONTROLS =
  'a[href], button, input, textarea, select, [role=button], [role=checkbox], [role=link], [role=radio], [role=switch], [role=tab]';
const TEXT_FIELDS = 'input, textarea, select, [contenteditable=true]';
const ARROW_GROUPS = '[role=radiogroup], [role=tablist]';
export const TALLY_ZONE = '[data-testid=tally]';

/**
 * Sends the page's keys to the tally. A control keeps its own keys only when it was reached with
 * Tab: a pedal pressed after a tap on a button counts, and never presses that button again.
 */
export function listenToKeys(send: (event: TallyInputEvent) => void): () => void {
  if (typeof window === 'undefined' || !('addEventListener' in window)) return () => undefined;
  let reachedByTab = false;
  const isTaken = (event: KeyboardEvent): boolean => {
    if (event.ctrlKey || event.metaKey || event.altKey) return true;
    const { target } = event;
    if (!(target instanceof Element)) return false;
    if (target.closest(TEXT_FIELDS) !== null) return true;
    if (!reachedByTab || target.closest(TALLY_ZONE) !== null) return false;
    if (event.key === 'ArrowRight') return target.closest(ARROW_GROUPS) !== null;
    if (event.key === 'PageDown') return false;
    return target.closest(CONTROLS) !== null;
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Tab') reachedByTab = true;
    if (!isTallyKey(event.key) || isTaken(event)) return;
    swallow(event);
    send({ type: 'key-down', key: event.key, repeat: event.repeat, atMs: performance.now() });
  };
  const onKeyUp = (event: KeyboardEvent) => {
    if (isTallyKey(event.key) && !isTaken(event)) swallow(event);
    send({ type: 'key-up', key: event.key });
  };
  const onPointerDown = () => {
    reachedByTab = false;
  };
  const onBlur = () => send({ type: 'keys-released' });
  window.addEventListener('keydown', onKeyDown, true);
  window.addEventListener('keyup', onKeyUp, true);
  window.addEventListener('pointerdown', onPointerDown, true);
  window.addEventListener('blur', onBlur);
  return () => {
    window.removeEventListener('keydown', onKeyDown, true);
    window.removeEventListener('keyup', onKeyUp, true);
    window.removeEventListener('pointerdown', onPointerDown, true);
    window.removeEventListener('blur', onBlur);
  };
}

/** Neither the page scrolls nor a focused control answers: the key was a count. */
function swallow(event: KeyboardEvent): void {
  event.preventDefault();
  event.stopImmediatePropagation();
}
