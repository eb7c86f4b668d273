/**
 * Runs counts one after the other in the order they were made, so that quick taps are never
 * dropped nor overtaken. A count that fails does not stop those behind it.
 */
export interface TallyQueue {
  add: (task: () => Promise<void>) => void;
  /** counts made and not yet answered */
  waiting: () => number;
}

export function createTallyQueue(onFailure: (reason: unknown) => void): TallyQueue {
  let tail = Promise.resolve();
  let waiting = 0;
  return {
    add: (task) => {
      waiting += 1;
      tail = tail
        .then(task)
        .catch(onFailure)
        .finally(() => {
          waiting -= 1;
        });
    },
    waiting: () => waiting,
  };
}
