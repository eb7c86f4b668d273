import type { PlanRefusal } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { refuse } from './refuse';

const WEDGE_FABRICS_MOST = 12;

/** Checks the fabrics of a request by each other, and the letters that name them. */
export function checkFabrics(request: PlanRequest): PlanRefusal[] {
  return [
    ...checkWedgeFabrics(request),
    ...checkLetters(request),
    ...checkDominant(request),
    ...checkUses(request),
  ];
}

function checkWedgeFabrics({ fabrics, wedges }: PlanRequest): PlanRefusal[] {
  const count = fabrics.filter(({ role }) => role === 'wedge').length;
  const most = Math.min(WEDGE_FABRICS_MOST, Math.max(1, wedges));
  if (count < 1) return [refuse('/fabrics', 'too-few-fabrics', { least: 1 })];
  return count > most ? [refuse('/fabrics', 'too-many-fabrics', { most })] : [];
}

function checkLetters({ fabrics }: PlanRequest): PlanRefusal[] {
  return fabrics.flatMap(({ letter }, index) =>
    fabrics.findIndex((other) => other.letter === letter) < index
      ? [refuse(`/fabrics/${index}/letter`, 'letter-twice', { letter })]
      : [],
  );
}

function checkDominant({ fabrics }: PlanRequest): PlanRefusal[] {
  const first = fabrics.findIndex(({ dominant }) => dominant);
  return fabrics.flatMap(({ letter, role, dominant }, index) => {
    const pointer = `/fabrics/${index}/dominant`;
    if (!dominant) return [];
    if (role !== 'wedge') return [refuse(pointer, 'wrong-role', { letter, role })];
    return index > first ? [refuse(pointer, 'two-dominant')] : [];
  });
}

function checkUses({ fabrics, background, centre }: PlanRequest): PlanRefusal[] {
  const roleOf = (letter: string) => fabrics.find((fabric) => fabric.letter === letter)?.role;
  const refusals: PlanRefusal[] = [];
  const role = roleOf(background.fabric);
  const letter = background.fabric;
  if (!role) refusals.push(refuse('/background/fabric', 'unknown-fabric', { letter }));
  else if (role !== 'background') {
    refusals.push(refuse('/background/fabric', 'wrong-role', { letter, role }));
  }
  if (centre.shape === 'circle' && !roleOf(centre.fabric)) {
    refusals.push(refuse('/centre/fabric', 'unknown-fabric', { letter: centre.fabric }));
  }
  return refusals;
}
