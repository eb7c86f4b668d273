/** The least time between the end of one copy and the start of the next, and after a failure. */
const PAUSE_MS = 250;
const RETRY_MS = 5000;

export interface KeepSoon {
  /** something changed */
  touch(): void;
  /** Writes what is not written yet, now. */
  flush(): Promise<void>;
}

/**
 * Keeps a copy of what changes: at once after the first change, then after pauses, one at a time.
 *
 * @param save writes the copy; after a failure it is tried again a while later
 * @param after runs a job later and returns what calls it off
 */
export function createKeepSoon(
  save: () => Promise<void>,
  after: (delayMs: number, job: () => void) => () => void,
): KeepSoon {
  let dirty = false;
  let saving: Promise<void> | null = null;
  let stopPause: (() => void) | null = null;

  const pause = (delayMs: number) => {
    saving = null;
    stopPause = after(delayMs, () => {
      stopPause = null;
      if (dirty) void keep();
    });
  };
  const keep = (): Promise<void> => {
    stopPause?.();
    stopPause = null;
    dirty = false;
    saving = save().then(
      () => pause(PAUSE_MS),
      () => {
        dirty = true;
        pause(RETRY_MS);
      },
    );
    return saving;
  };
  return {
    touch() {
      dirty = true;
      if (!saving && !stopPause) void keep();
    },
    async flush() {
      await saving;
      if (dirty) await keep();
    },
  };
}
