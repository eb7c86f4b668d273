import type { Page } from 'playwright-core';

import { newId } from '../../sync/client/new-id';
import type { Command } from '../../sync/store/command';
import type { PlanStep } from '../../shared/model/plan';
import { defaultRequest } from '../../shared/plan/default-request';
import { makePlan } from '../../shared/plan/make-plan';
import { askStore } from '../support/demo-store';

const COMMANDS_AT_ONCE = 250;
const TAPS_BEFORE_A_PLATE = 100; // a little more are made: strips are shared by plates
const WEDGES = 40;

export interface BenchProject {
  address: string;
  /** taps that stand before any is measured */
  taps: number;
}

/**
 * A project in which every step before turning the tips was tapped to its end, one tap each, and
 * every tap written by the product's own leading tab.
 *
 * @param tapsBefore at least so many taps
 * @param tapsAfter tips that stay to be turned
 */
export async function makeBenchProject(
  page: Page,
  tapsBefore: number,
  tapsAfter: number,
): Promise<BenchProject> {
  const blocks = Math.max(
    Math.ceil(tapsBefore / TAPS_BEFORE_A_PLATE),
    Math.ceil(tapsAfter / WEDGES),
  );
  const request = defaultRequest({
    block: '24',
    blocks,
    wedges: WEDGES,
    tip: 'pointed',
    centre: 'circle',
    fabrics: ['A', 'B', 'C'].map((letter) => ({
      letter,
      name: `Cloth ${letter}`,
      role: letter === 'C' ? 'background' : 'wedge',
      colour: '#86AAB8',
      oneWay: false,
      dominant: false,
    })),
  });
  const plan = makePlan(request);
  if (!plan.ok) throw new Error(`no plan: ${JSON.stringify(plan.errors)}`);
  const id = newId(Date.now());
  await askStore(page, [{ do: 'create', id, name: 'Bench', note: '', request }]);
  const turning = plan.value.steps.findIndex(({ role }) => role === 'tip-turn');
  const taps = plan.value.steps.slice(0, turning).flatMap((step) => tapsOf(id, step));
  for (let at = 0; at < taps.length; at += COMMANDS_AT_ONCE) {
    await askStore(page, taps.slice(at, at + COMMANDS_AT_ONCE));
  }
  return { address: `/projects/${id}`, taps: taps.length };
}

function tapsOf(id: string, step: PlanStep): Command[] {
  return step.lanes.flatMap((lane) => {
    const key = { step: step.key, lane: lane.key, kind: 'done' as const };
    return Array.from({ length: lane.target }, (): Command => ({ do: 'tap', id, key, delta: 1 }));
  });
}
