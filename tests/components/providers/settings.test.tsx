import AsyncStorage from '@react-native-async-storage/async-storage';
import { act, renderHook, waitFor } from '@testing-library/react-native';

import { parseSettings, SettingsProvider, useSettings } from '@/components/providers/settings';
import { useTheme } from '@/components/ui/theme';
import { DEFAULT_SETTINGS } from '@/shared/model/settings';

const KEY = 'matside.settings';
const open = <Value,>(use: () => Value) => renderHook(use, { wrapper: SettingsProvider });

beforeEach(() => AsyncStorage.clear());

it('keeps a change for the next visit', async () => {
  const first = open(useSettings);
  await waitFor(() => expect(first.result.current.loaded).toBe(true));
  act(() => first.result.current.change({ theme: 'lamp' }));
  act(() => first.result.current.change({ bladeMm: 60 }));
  expect(first.result.current.settings).toMatchObject({ theme: 'lamp', bladeMm: 60 });

  const second = open(useSettings);
  await waitFor(() => expect(second.result.current.settings.bladeMm).toBe(60));
  expect(second.result.current.settings.theme).toBe('lamp');
});

it('lets one broken value fall back and keeps the others', () => {
  const kept = parseSettings('{"theme":"purple","bladeMm":28,"leftHanded":true}');
  expect(kept).toEqual({ ...DEFAULT_SETTINGS, bladeMm: 28, leftHanded: true });
});

it.each(['', '{', 'null', '[]', '"text"'])('starts anew from %j', (text) => {
  expect(parseSettings(text)).toEqual(DEFAULT_SETTINGS);
});

it('puts Lamp in force when the maker asks for it', async () => {
  await AsyncStorage.setItem(KEY, '{"theme":"lamp"}');
  const theme = open(useTheme);
  await waitFor(() => expect(theme.result.current.name).toBe('lamp'));
  expect(theme.result.current.color.paper).toBe('#17130E');
});
