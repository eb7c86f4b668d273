import AsyncStorage from '@react-native-async-storage/async-storage';
import { act } from 'react';

import { StationScreen } from '@/components/station/station-screen';
import type { PlanRequest } from '@/shared/model/plan-request';
import type { TallyKind } from '@/shared/model/tally';
import { projects } from '@/sync/client/projects';
import type { ProjectView } from '@/sync/client/projects-client';

import { fakeRouter } from '../projects/fake-router';
import { byId, openPage } from '../projects/page';
import { click, type Mounted } from '../ui/mount-web';

const KEY = 'matside.cuttingVisit';
let nowMs = 1_000;

/** Time that only moves when a test says so: counts closer than 180 ms are one. */
export function holdTime(): void {
  nowMs = 1_000;
  jest.spyOn(performance, 'now').mockImplementation(() => nowMs);
}

export function wait(ms: number): void {
  nowMs += ms;
}

/** Lets what a press started reach the disk and the screen. */
export const settle = () =>
  act(async () => {
    await new Promise((resolve) => setTimeout(resolve, 20));
  });

/** A cutting visit that goes on, so that the check does not stand before the work. */
export const checkDone = () =>
  AsyncStorage.setItem(
    KEY,
    JSON.stringify({ opened: 'checked', adult: false, lastSeenAtMs: Date.now() }),
  );

export async function createProject(request: PlanRequest): Promise<string> {
  await projects.start();
  const made = await projects.create({ name: 'Five plates', request });
  if (!made.ok) throw new Error('not created');
  return made.project.id;
}

export function project(id: string): ProjectView {
  const found = projects.snapshot().projects.find((each) => each.id === id);
  if (!found) throw new Error('no project');
  return found;
}

/** A count as kept; "" as the lane means all lanes of the step. */
export function kept(id: string, role: string, kind: TallyKind, lane = ''): number {
  const step = project(id).steps.find((each) => each.role === role);
  return project(id)
    .tallies.filter((each) => each.step === step?.key && each.kind === kind)
    .filter((each) => lane === '' || each.lane === lane)
    .reduce((sum, { shown }) => sum + shown, 0);
}

/** Sets every lane of a step to its target, or to what is given. */
export async function fill(id: string, role: string, taps?: number): Promise<void> {
  const step = project(id).steps.find((each) => each.role === role);
  for (const lane of step?.lanes ?? []) {
    const key = { step: step?.key ?? '', lane: lane.key, kind: 'done' as const };
    await projects.set(id, key, taps ?? lane.target);
  }
}

export async function openStation(id: string, station: string, step?: string): Promise<Mounted> {
  fakeRouter.reset({ id, station, ...(step !== undefined && { step }) });
  const page = await openPage(<StationScreen />);
  await settle();
  return page;
}

/** One tap on the zone, apart from the one before. */
export async function tap(): Promise<void> {
  wait(200);
  await click(byId('tally'));
  await settle();
}

export async function pressKey(key: string, target: Element = document.body): Promise<void> {
  wait(200);
  const init = { key, bubbles: true, cancelable: true };
  await act(async () => {
    target.dispatchEvent(new KeyboardEvent('keydown', init));
    target.dispatchEvent(new KeyboardEvent('keyup', init));
  });
  await settle();
}

/** "40 of 100 pieces cut. Tap adds 5.": the zone says its count. */
export const zoneName = () => byId('tally').textContent ?? '';
