import type { Href } from 'expo-router';

import type { Station, StepRole } from '@/shared/model/codes';

/** The page of a project's station, open at one step. */
export function stationHref(projectId: string, station: Station, role: StepRole): Href {
  return `/projects/${projectId}/${station}?step=${role}` as Href;
}
