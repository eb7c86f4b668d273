import { compareStamped, nameIdentity, type Identity, type Stamped } from './identity';

/** A write on top of another: a set of a count, a write of a field. */
export interface BasedWrite extends Stamped {
  /** the ruling write its maker saw; null when there was none */
  base: Identity | null;
}

/**
 * The write that rules: the largest (stamp, session, seq) among those that are not undone and that
 * no other such write has in its chain of bases. The order of `writes` is of no account.
 *
 * @param writes all writes held, undone ones too (chains lead through them)
 * @param undone names (`nameIdentity`) of the undone ones
 */
export function findRuling<Write extends BasedWrite>(
  writes: readonly Write[],
  undone: ReadonlySet<string> = new Set(),
): Write | null {
  const byName = new Map(writes.map((write) => [nameIdentity(write), write]));
  const standing = [...byName].filter(([name]) => !undone.has(name));
  const beaten = new Set(standing.flatMap(([, write]) => [...chainOf(write, byName)]));
  return standing
    .filter(([name]) => !beaten.has(name))
    .reduce<Write | null>(
      (best, [, write]) => (best && compareStamped(best, write) > 0 ? best : write),
      null,
    );
}

function chainOf(write: BasedWrite, byName: ReadonlyMap<string, BasedWrite>): Set<string> {
  const chain = new Set<string>();
  let base = write.base;
  while (base) {
    const name = nameIdentity(base);
    if (chain.has(name)) break;
    chain.add(name);
    base = byName.get(name)?.base ?? null;
  }
  return chain;
}
