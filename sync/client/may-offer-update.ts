import { STATIONS } from '../../shared/model/codes';

const PAUSE_MS = 60_000;

/**
 * Whether a new release may be offered now: never in the middle of counting at a station.
 *
 * @param lastCountAtMs the last count in any tab, null when there was none
 * @param atStation whether this tab shows a station
 */
export function mayOffer(lastCountAtMs: number | null, nowMs: number, atStation: boolean): boolean {
  if (!atStation || lastCountAtMs === null) return true;
  // a clock set back by more than a pause must not keep an update away for ever
  return Math.abs(nowMs - lastCountAtMs) >= PAUSE_MS;
}

/** Whether a path of the app is a station of a project: `/projects/<id>/table`. */
export function isStationPath(path: string): boolean {
  const [, place, id, station] = path.split('/');
  return place === 'projects' && Boolean(id) && STATIONS.some((name) => name === station);
}
