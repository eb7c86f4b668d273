import { act, type ReactNode } from 'react';
import { createRoot } from 'react-dom/client';

(globalThis as { IS_REACT_ACT_ENVIRONMENT?: boolean }).IS_REACT_ACT_ENVIRONMENT = true;

export interface Mounted {
  host: HTMLElement;
  show(node: ReactNode): Promise<void>;
  unmount(): Promise<void>;
}

/** Renders into a real DOM, as react-dom and react-native-web do in a browser. */
export async function mountWeb(node: ReactNode): Promise<Mounted> {
  const host = document.createElement('div');
  document.body.append(host);
  const root = createRoot(host);
  const show = (next: ReactNode) => act(async () => root.render(next));
  await show(node);
  return {
    host,
    show,
    unmount: () =>
      act(async () => {
        root.unmount();
        host.remove();
      }),
  };
}

/** One element of the whole page, portals included; its absence is the test's failure. */
export function find(selector: string): HTMLElement {
  const found = document.querySelector<HTMLElement>(selector);
  if (!found) throw new Error(`nothing matches ${selector}`);
  return found;
}

/** Presses and lets go of a key on an element, as a keyboard would. */
export async function press(element: Element, key: string): Promise<KeyboardEvent> {
  const down = new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true });
  await act(async () => {
    element.dispatchEvent(down);
    element.dispatchEvent(new KeyboardEvent('keyup', { key, bubbles: true, cancelable: true }));
  });
  return down;
}

export const click = (element: HTMLElement) => act(async () => element.click());
