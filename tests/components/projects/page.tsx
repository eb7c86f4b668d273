import { act, type ReactNode } from 'react';
import { SafeAreaProvider } from 'react-native-safe-area-context';

import { SettingsProvider } from '@/components/providers/settings';
import { ToastProvider } from '@/components/providers/toast';

import { find, type Mounted, mountWeb } from '../ui/mount-web';

// whole screens in jsdom: seconds, on a machine that has other work too
jest.setTimeout(60_000);

const INSETS = {
  frame: { x: 0, y: 0, width: 390, height: 844 },
  insets: { top: 0, left: 0, right: 0, bottom: 0 },
};

/** A screen inside the providers that every page has. */
export async function openPage(screen: ReactNode): Promise<Mounted> {
  const page = await mountWeb(
    <SafeAreaProvider initialMetrics={INSETS}>
      <SettingsProvider>
        <ToastProvider>{screen}</ToastProvider>
      </SettingsProvider>
    </SafeAreaProvider>,
  );
  await act(async () => undefined); // what was kept has been read by now
  return page;
}

export const text = () => document.body.textContent ?? '';
export const byId = (testID: string) => find(`[data-testid="${testID}"]`);
export const seek = (testID: string) =>
  document.querySelector<HTMLElement>(`[data-testid="${testID}"]`);

/** Types over what stands in a field, as react-dom hears it from a browser. */
export async function typeInto(testID: string, typed: string): Promise<void> {
  const input = byId(testID);
  if (!(input instanceof HTMLInputElement)) throw new Error(`${testID} is no input`);
  const setter = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;
  await act(async () => {
    input.focus();
    setter?.call(input, typed);
    input.dispatchEvent(new Event('input', { bubbles: true }));
  });
}

export const leaveField = (testID: string) => act(async () => byId(testID).blur());

/** Its words but for those that are hidden from a reader. */
function readWords(element: HTMLElement): string | null {
  const copy = element.cloneNode(true) as HTMLElement;
  for (const hidden of copy.querySelectorAll('[aria-hidden=true]')) hidden.remove();
  return copy.textContent;
}

/** The element that is pressed by its words or by its name. */
export function named(name: string): HTMLElement {
  const all = document.querySelectorAll<HTMLElement>('[role=button],[role=radio],[role=switch],a');
  const found = [...all].find(
    (one) => one.getAttribute('aria-label') === name || readWords(one) === name,
  );
  if (!found) throw new Error(`nothing to press is called ${name}`);
  return found;
}
