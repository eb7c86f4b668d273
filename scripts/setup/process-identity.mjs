import { readFileSync } from 'node:fs';

/**
 * Names a process for good: its id and the tick it started at, since Linux uses ids again.
 * `null` when no such process lives.
 */
export function identityOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' '); // the name may hold spaces
    const [state, startTick] = [fields[0], fields[19]];
    return state === 'Z' ? null : `${pid}-${startTick}`;
  } catch {
    return null;
  }
}

export const SELF = identityOf(process.pid);

export function isAlive(identity) {
  return identityOf(identity.split('-')[0]) === identity;
}
