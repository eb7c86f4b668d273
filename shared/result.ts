/** An expected outcome as a value: callers branch on `ok`, and a failure carries its own `kind`. */
export type Result<Value, Failure extends { kind: string }> =
  { ok: true; value: Value } | ({ ok: false } & Failure);

/** Thrown for states that the code's own rules make impossible; never for a maker's input. */
export class InvariantError extends Error {
  override name = 'InvariantError';
}
