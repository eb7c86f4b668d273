import { CAUTION_TEXTS, MISTAKE_TEXTS } from '@/components/steps/caution-texts';
import { itemLetters } from '@/components/steps/item-words';
import { STEP_TITLES } from '@/components/steps/step-titles';
import { STEP_WHYS } from '@/components/steps/step-whys';
import { UNIT_WORDS } from '@/components/steps/unit-words';
import type { Caution, Mistake, StepRole } from '@/shared/model/codes';
import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';
import { InvariantError } from '@/shared/result';
import { formatInches } from '@/shared/units/format-fraction';

/** The instruction of a step: what to do, with its size or number. */
export function stepTitle(step: PlanStep): string {
  const read = (name: string): string | number => {
    const value = step.title.params[name];
    if (value === undefined) throw new InvariantError(`${step.role} has no parameter ${name}`);
    return value;
  };
  return STEP_TITLES[step.role]({
    inches: (name) => formatInches(String(read(name))),
    count: (name) => Number(read(name)),
    word: (name) => String(read(name)),
  });
}

/** Why the step is done, and how, with the plan's own sizes. */
export function stepWhy(step: PlanStep, plan: Plan): string {
  return STEP_WHYS[step.role](plan, step);
}

/** "pieces", "pairs", "strips": what a step of this role counts. */
export function unitWord(role: StepRole, count: number): string {
  return count === 1 ? UNIT_WORDS[role].one : UNIT_WORDS[role].many;
}

/** "cut", "sewn", "pressed": the word behind the count. */
export function madeWord(role: StepRole): string {
  return UNIT_WORDS[role].made;
}

/** "Pair A+C", "Stack A C B D E", "D, 1 layer": what a lane of a step makes. */
export function laneName(step: PlanStep, lane: PlanLane): string {
  const letters = Object.keys(lane.makes).map(itemLetters);
  const named = letters.filter((each) => each !== '');
  if (step.role === 'cut') {
    return named.length === 1 ? `${named.join('')}, 1 layer` : `Stack ${named.join(' ')}`;
  }
  const unit = unitWord(step.role, 1);
  const word = unit.charAt(0).toUpperCase() + unit.slice(1);
  return named.length === 0 ? word : `${word} ${named.join(' ')}`;
}

export function cautionText(code: Caution): string {
  return CAUTION_TEXTS[code];
}

/** What goes wrong, how to see it, and what to do. */
export function mistakeText(code: Mistake): string {
  return MISTAKE_TEXTS[code];
}
