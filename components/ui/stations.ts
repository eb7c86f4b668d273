import type { Station } from '@/shared/model/codes';

/** What the stations are called wherever one is named. */
export const STATION_NAMES: Record<Station, string> = {
  table: 'Table',
  machine: 'Machine',
  iron: 'Iron',
  chair: 'Chair',
  wall: 'Wall',
};
