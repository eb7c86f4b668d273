import AsyncStorage from '@react-native-async-storage/async-storage';

import { SetupScreen } from '@/components/plan/setup-screen';

import { fakeRouter } from '../projects/fake-router';
import { byId, leaveField, openPage, typeInto } from '../projects/page';
import type { Mounted } from '../ui/mount-web';

let page: Mounted | null = null;

/** Opens the set-up form with these parameters in its address. */
export async function open(params: Record<string, string> = {}): Promise<void> {
  fakeRouter.reset(params);
  page = await openPage(<SetupScreen />);
}

export async function close(): Promise<void> {
  await page?.unmount();
  page = null;
}

export const forgetDrafts = () => AsyncStorage.clear();

/** Types into a field and leaves it. */
export async function fill(field: string, typed: string): Promise<void> {
  await typeInto(field, typed);
  await leaveField(field);
}

export function valueOf(field: string): string {
  const input = byId(field);
  return input instanceof HTMLInputElement ? input.value : '';
}

/** What stands under a field as its error. */
export function errorOf(field: string): string | null {
  const id = byId(field).getAttribute('aria-describedby') ?? '';
  return document.getElementById(id)?.textContent ?? null;
}

export const totals = () => byId('totals').textContent;
