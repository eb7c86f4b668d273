import type { PlanLane, PlanStep } from '../model/plan';
import type { ExtraLane, Tally } from '../model/tally';
import { inParts, partsPerWhole } from './parts-per-whole';

/** Amounts by item, in whole parts: `parts` of them are one piece, strip or stack. */
export type Amounts = Map<string, number>;

export interface LaneState {
  lane: PlanLane;
  extra: boolean;
  /** taps that stand: done − unpicked */
  done: number;
  /** what one tap uses and makes, by item, in parts */
  uses: [item: string, parts: number][];
  makes: [item: string, parts: number][];
}

export interface StepState {
  step: PlanStep;
  lanes: LaneState[];
}

export interface WorkState {
  parts: number;
  steps: StepState[];
}

export interface ItemAmounts {
  made: Amounts;
  used: Amounts;
  lost: Amounts;
}

export function amountOf(amounts: Amounts, item: string): number {
  return amounts.get(item) ?? 0;
}

export function addAmount(amounts: Amounts, item: string, parts: number): void {
  amounts.set(item, amountOf(amounts, item) + parts);
}

/** Every step's lanes, extra ones last, with the taps that stand. */
export function readWork(
  steps: readonly PlanStep[],
  extraLanes: readonly ExtraLane[],
  tallies: readonly Tally[],
): WorkState {
  const parts = partsPerWhole([...steps.flatMap(({ lanes }) => lanes), ...extraLanes]);
  const shown = new Map(tallies.map((tally) => [tallyId(tally), tally.shown]));
  const stateOf = (step: PlanStep, lane: PlanLane, extra: boolean): LaneState => {
    const countOf = (kind: Tally['kind']) =>
      shown.get(tallyId({ step: step.key, lane: lane.key, kind })) ?? 0;
    return {
      lane,
      extra,
      done: Math.max(0, countOf('done') - countOf('unpicked')),
      uses: Object.entries(lane.consumes).map(([item, each]) => [item, inParts(each, parts)]),
      makes: Object.entries(lane.makes).map(([item, each]) => [item, each * parts]),
    };
  };
  return {
    parts,
    steps: steps.map((step) => ({
      step,
      lanes: [
        ...step.lanes.map((lane) => stateOf(step, lane, false)),
        ...extraLanes
          .filter((lane) => lane.step === step.key)
          .map((lane) => stateOf(step, lane, true)),
      ],
    })),
  };
}

/** What was made, used and lost of every item; unpicking has given its inputs back. */
export function readItems({ steps, parts }: WorkState, tallies: readonly Tally[]): ItemAmounts {
  const items: ItemAmounts = { made: new Map(), used: new Map(), lost: new Map() };
  for (const { uses, makes, done } of steps.flatMap(({ lanes }) => lanes)) {
    for (const [item, each] of uses) addAmount(items.used, item, each * done);
    for (const [item, each] of makes) addAmount(items.made, item, each * done);
  }
  for (const { lane, kind, shown } of tallies) {
    if (kind === 'lost') addAmount(items.lost, lane, shown * parts);
  }
  return items;
}

function tallyId({ step, lane, kind }: Pick<Tally, 'step' | 'lane' | 'kind'>): string {
  return `${kind}\n${lane}\n${step}`;
}
