import type { Answer, Command } from '../../store/command';

// A leader takes no request after its deadline, and a tab waits a little longer than that: so what
// was given up here is not done later behind the maker's back.
export const REQUEST_VALID_MS = 4000;
const ANSWER_WITHIN_MS = 5000;

interface Waiting {
  command: Command;
  resolve(answer: Answer): void;
  stopTimer(): void;
}

/** Commands that were sent, or are to be sent, to a leader and have no answer yet. */
export interface WaitingRequests {
  add(request: string, command: Command): Promise<Answer>;
  settle(request: string, answer: Answer): void;
  /** Every one again, in the order asked: for a new leader. */
  again(send: (request: string, command: Command) => void): void;
  failAll(answer: Answer): void;
}

export function createWaitingRequests(
  after: (delayMs: number, job: () => void) => () => void,
): WaitingRequests {
  const waiting = new Map<string, Waiting>();
  const settle = (request: string, answer: Answer) => {
    const entry = waiting.get(request);
    waiting.delete(request);
    entry?.stopTimer();
    entry?.resolve(answer);
  };
  const startTimer = (request: string) =>
    after(ANSWER_WITHIN_MS, () => settle(request, { ok: false, kind: 'open-elsewhere' }));
  return {
    add: (request, command) =>
      new Promise((resolve) => {
        waiting.set(request, { command, resolve, stopTimer: startTimer(request) });
      }),
    settle,
    again(send) {
      for (const [request, entry] of waiting) {
        entry.stopTimer();
        entry.stopTimer = startTimer(request);
        send(request, entry.command);
      }
    },
    failAll(answer) {
      for (const request of [...waiting.keys()]) settle(request, answer);
    },
  };
}
