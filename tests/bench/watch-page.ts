/** Times of one tap on the page's own clock, in ms. */
export interface TapTimes {
  /** the browser took the key in */
  pressed: number;
  /** the page's first listener ran */
  heard: number;
  /** the DOM holds the new number */
  shown: number;
  /** the frame after that is done; 0 until then */
  painted: number;
}

declare global {
  interface Window {
    tapTimes: TapTimes[];
    /** when the button that is waited for was on the screen, since the navigation began */
    usableMs: number;
  }
}

/** Runs in every page before the app does: notes when a key was pressed and its count shown. */
export function watchPage(): void {
  const numberShown = () => document.querySelector('[data-testid=tally-number]')?.textContent;
  const afterFrame = (done: () => void) =>
    requestAnimationFrame(() => {
      const channel = new MessageChannel();
      channel.port1.onmessage = done;
      channel.port2.postMessage(null);
    });
  let tap: { pressed: number; heard: number; before: string } | null = null;
  window.tapTimes = [];
  window.usableMs = 0;
  const onKey = (event: KeyboardEvent) => {
    const before = numberShown();
    if (event.key !== 'PageDown' || tap || !before) return;
    tap = { pressed: event.timeStamp, heard: performance.now(), before };
  };
  const look = () => {
    const now = performance.now();
    if (tap && numberShown() !== tap.before) {
      const { pressed, heard } = tap;
      const times: TapTimes = { pressed, heard, shown: now, painted: 0 };
      tap = null;
      window.tapTimes.push(times);
      afterFrame(() => {
        times.painted = performance.now();
      });
    }
    if (window.usableMs === 0 && document.querySelector('[data-testid=carry-on-go]')) {
      window.usableMs = now;
      afterFrame(() => {
        window.usableMs = performance.now();
      });
    }
  };
  window.addEventListener('keydown', onKey, true);
  const everything = { subtree: true, childList: true, characterData: true };
  new MutationObserver(look).observe(document, everything);
}
