import { useEffect, useState } from 'react';
import { Platform } from 'react-native';

/**
 * Moves the focus to the field with this test id after the next render, when a section that was
 * closed has opened. On a device the errors are read out instead (live regions).
 */
export function useFocusRequest(): (field: string) => void {
  const [wanted, setWanted] = useState<{ field: string } | null>(null);
  useEffect(() => {
    if (wanted === null || Platform.OS !== 'web') return;
    document.querySelector<HTMLElement>(`[data-testid="${wanted.field}"]`)?.focus();
  }, [wanted]);
  return (field) => setWanted({ field });
}
