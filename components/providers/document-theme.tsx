import { useEffect } from 'react';
import { Platform } from 'react-native';

import { type Theme, useTheme } from '@/components/ui/theme';

function themeColorTag(): HTMLMetaElement {
  const found = document.querySelector<HTMLMetaElement>('meta[name=theme-color]');
  if (found) return found;
  const made = document.createElement('meta');
  made.name = 'theme-color';
  document.head.append(made);
  return made;
}

/**
 * Gives the page itself the theme: its background, the browser's own controls and bar, and the
 * colours that public/app.css needs. Through the CSSOM, which the content policy allows.
 */
function paintDocument({ name, color }: Theme): void {
  const { style } = document.documentElement;
  style.backgroundColor = color.paper;
  style.colorScheme = name === 'lamp' ? 'dark' : 'light';
  style.setProperty('--focus', color.focus);
  style.setProperty('--focus-gap', color.focusGap);
  style.setProperty('--paper', color.paper);
  style.setProperty('--ink', color.ink);
  themeColorTag().content = color.paper;
}

/** Keeps the document in the theme that is in force; draws nothing. */
export function DocumentTheme() {
  const theme = useTheme();
  useEffect(() => {
    if (Platform.OS === 'web') paintDocument(theme);
  }, [theme]);
  return null;
}
