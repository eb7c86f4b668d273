/** One line of progress. On standard error, so that a command's own output stays clean. */
export function say(line) {
  process.stderr.write(`${line}\n`);
}

/** A failure whose message tells the reader what to do: printed without a stack. */
export class SetupError extends Error {}
