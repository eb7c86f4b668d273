import { useSyncExternalStore } from 'react';
import { Platform } from 'react-native';

const BROWSER_DEFAULT_PX = 16;

function readScale(): number {
  if (Platform.OS !== 'web') return 1; // the system scales Text by itself
  const root = parseFloat(getComputedStyle(document.documentElement).fontSize);
  return Math.min(2, Math.max(1, (root || BROWSER_DEFAULT_PX) / BROWSER_DEFAULT_PX));
}

let scale: number | null = null;
const currentScale = () => (scale ??= readScale());

function subscribe(onChange: () => void): () => void {
  if (Platform.OS !== 'web') return () => undefined;
  const reread = () => {
    scale = readScale();
    onChange();
  };
  window.addEventListener('resize', reread);
  document.addEventListener('visibilitychange', reread);
  return () => {
    window.removeEventListener('resize', reread);
    document.removeEventListener('visibilitychange', reread);
  };
}

/** How much larger than 100 % the maker reads, 1 to 2: the browser's own font size. */
export function useTextScale(): number {
  return useSyncExternalStore(subscribe, currentScale, () => 1);
}
