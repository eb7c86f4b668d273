import { useIsFocused } from 'expo-router';
import { type RefObject, useEffect } from 'react';
import { Platform, type Text } from 'react-native';

let firstPage = true;

/**
 * Names the browser's tab after the page and, after a change of page, puts the focus on the page's
 * title, so that a screen reader and the Tab key start there.
 */
export function usePageTitle(title: string, heading: RefObject<Text | null>): void {
  const focused = useIsFocused();
  useEffect(() => {
    if (!focused || Platform.OS !== 'web') return;
    document.title = title === 'Matside' ? title : `${title} · Matside`;
  }, [focused, title]);
  useEffect(() => {
    if (!focused) return;
    if (!firstPage) heading.current?.focus();
    firstPage = false;
  }, [focused, heading]);
}
