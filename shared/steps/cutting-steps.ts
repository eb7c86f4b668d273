import type { PlanLane } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import type { CutGroup } from '../patterns/ring/ring-cutting';
import { toText } from '../units/fraction';
import { wedgeName } from './piece-name';
import { lane, type StepDraft } from './step-draft';

/** From cloth to wedges: strips, lengths, stacks, cuts. One tap on a stack is a cut through it. */
export function cuttingSteps(request: PlanRequest, groups: readonly CutGroup[]): StepDraft[] {
  const piece = wedgeName(request);
  const [first] = groups;
  const step = (role: StepDraft['role'], params: StepDraft['params'], lanes: PlanLane[]) =>
    ({ role, piece, fabricRole: 'wedge', params, lanes }) satisfies StepDraft;
  return [
    step('strip', { height: request.stripHeight }, inListOrder(request, groups, stripLane)),
    step(
      'length',
      { length: first ? toText(first.cut.length) : '0' },
      inListOrder(request, groups, lengthLane),
    ),
    step('stack', { layers: deepest(groups) }, groups.map(stackLane)),
    step('cut', { each: first?.cut.each ?? 0 }, groups.map(cutLane)),
  ];
}

/** The item a stack counts as. @example "stack:A+B+C+D" */
function stackItem(group: CutGroup): string {
  return `stack:${lettersOf(group).join('+')}`;
}

function lettersOf(group: CutGroup): string[] {
  return group.fabrics.map(({ letter }) => letter);
}

function deepest(groups: readonly CutGroup[]): number {
  return Math.max(...groups.map(({ fabrics }) => fabrics.length));
}

function inListOrder(
  request: PlanRequest,
  groups: readonly CutGroup[],
  laneOf: (letter: string, group: CutGroup) => PlanLane,
): PlanLane[] {
  return request.fabrics.flatMap((fabric) => {
    const group = groups.find(({ fabrics }) => fabrics.includes(fabric));
    return group ? [laneOf(fabric.letter, group)] : [];
  });
}

function stripLane(letter: string, { cut }: CutGroup): PlanLane {
  return lane(letter, cut.strips, {}, `strip:${letter}`);
}

function lengthLane(letter: string, { cut }: CutGroup): PlanLane {
  const share = partOf(cut.lengthsPerStrip);
  return lane(letter, cut.lengths, { [`strip:${letter}`]: share }, `length:${letter}`);
}

function stackLane(group: CutGroup): PlanLane {
  const letters = lettersOf(group);
  const consumes = Object.fromEntries(letters.map((letter) => [`length:${letter}`, 1]));
  return lane(letters.join('+'), group.cut.lengths, consumes, stackItem(group));
}

function cutLane(group: CutGroup): PlanLane {
  const letters = lettersOf(group);
  const { each, lastEach, lengths } = group.cut;
  return {
    key: letters.map((letter) => `${letter}1`).join('+'),
    target: each * (lengths - 1) + lastEach,
    consumes: { [stackItem(group)]: partOf(each) },
    makes: Object.fromEntries(letters.map((letter) => [`wedge:${letter}`, 1])),
  };
}

function partOf(count: number): number | string {
  return count === 1 ? 1 : `1/${count}`;
}
