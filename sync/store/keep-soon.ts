/** When a copy is written: soon after a pause, and at the latest a second after the first change. */
const PAUSE_MS = 200;
const LATEST_MS = 1000;

export interface KeepSoon {
  /** something changed */
  touch(): void;
  /** Writes what is not written yet, now. */
  flush(): Promise<void>;
}

/**
 * @param save writes the copy; a failure is left to the next change
 * @param after runs a job later and returns what calls it off
 */
export function createKeepSoon(
  save: () => Promise<void>,
  after: (delayMs: number, job: () => void) => () => void,
): KeepSoon {
  let stopPause = () => {};
  let stopLatest: (() => void) | null = null;
  const flush = async () => {
    if (!stopLatest) return;
    stopPause();
    stopLatest();
    stopLatest = null;
    await save().catch(() => undefined);
  };
  return {
    touch() {
      stopPause();
      stopPause = after(PAUSE_MS, () => void flush());
      stopLatest ??= after(LATEST_MS, () => void flush());
    },
    flush,
  };
}
