import type { LaneProgress, StepProgress } from '@/shared/model/tally';
import type { UndoableAct } from '@/sync/client/projects-client';

/** What − does at a step: "−5", or "+1" where it takes a miscut or an unpicked pair back. */
export function undoLabel(
  step: StepProgress,
  act: UndoableAct | undefined,
  lane: LaneProgress | null,
): { label: string; spoken: string } {
  const pieces = act ? piecesOf(step, act) : (lane?.perTap ?? 1);
  const adds = act !== undefined && pieces < 0;
  const count = Math.abs(pieces);
  return adds
    ? { label: `+${count}`, spoken: `Put back ${count}` }
    : { label: `−${count}`, spoken: `Take back ${count}` };
}

/** Pieces that leave the count when the act is undone; negative where they come back. */
function piecesOf(step: StepProgress, act: UndoableAct): number {
  const perTap = step.lanes.find(({ lane }) => lane.key === act.lane)?.perTap ?? 1;
  if (act.kind === 'lost') return -act.delta;
  return (act.kind === 'unpicked' ? -act.delta : act.delta) * perTap;
}
