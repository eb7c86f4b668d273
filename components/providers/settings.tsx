import AsyncStorage from '@react-native-async-storage/async-storage';
import {
  createContext,
  type ReactNode,
  useCallback,
  useContext,
  useEffect,
  useRef,
  useState,
} from 'react';

import { DEFAULT_SETTINGS, type Settings, SettingsSchema } from '@/shared/model/settings';

const KEY = 'matside.settings';

interface SettingsContextValue {
  settings: Settings;
  change(patch: Partial<Settings>): void;
  /** false until what was kept has been read */
  loaded: boolean;
}

const SettingsContext = createContext<SettingsContextValue>({
  settings: DEFAULT_SETTINGS,
  change: () => undefined,
  loaded: true,
});

/** Reads kept settings; whatever is broken or unknown falls back field by field. */
export function parseSettings(text: string | null): Settings {
  if (text === null) return DEFAULT_SETTINGS;
  try {
    const parsed = SettingsSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : DEFAULT_SETTINGS;
  } catch {
    return DEFAULT_SETTINGS;
  }
}

export function SettingsProvider({ children }: { children: ReactNode }) {
  const [settings, setSettings] = useState(DEFAULT_SETTINGS);
  const [loaded, setLoaded] = useState(false);
  const latest = useRef(DEFAULT_SETTINGS);

  useEffect(() => {
    let gone = false;
    const show = (kept: Settings) => {
      if (gone) return;
      latest.current = kept;
      setSettings(kept);
      setLoaded(true);
    };
    AsyncStorage.getItem(KEY).then(
      (text) => show(parseSettings(text)),
      () => show(DEFAULT_SETTINGS), // no storage at all: the settings last as long as the page
    );
    return () => {
      gone = true;
    };
  }, []);

  const change = useCallback((patch: Partial<Settings>) => {
    latest.current = { ...latest.current, ...patch };
    setSettings(latest.current);
    AsyncStorage.setItem(KEY, JSON.stringify(latest.current)).catch(() => undefined);
  }, []);

  return <SettingsContext value={{ settings, change, loaded }}>{children}</SettingsContext>;
}

export function useSettings(): SettingsContextValue {
  return useContext(SettingsContext);
}
