import type { Href } from 'expo-router';

import type { IconName } from '@/components/ui/icon';

export type Place = 'ready' | 'projects' | 'me';

/** The places that do something, in the order of the bar. */
export const PLACES: readonly { place: Place; name: string; icon: IconName; href: Href }[] = [
  { place: 'ready', name: 'Ready', icon: 'ready', href: '/' },
  { place: 'projects', name: 'Projects', icon: 'projects', href: '/projects' },
  { place: 'me', name: 'Me', icon: 'me', href: '/me' },
];
