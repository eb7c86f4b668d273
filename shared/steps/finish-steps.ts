import type { Diagram } from '../model/codes';
import type { PlanLane, PlanStep } from '../model/plan';
import { ROLE_FACTS } from './role-facts';
import type { StepDraft } from './step-draft';

/** Gives drafts their place in the order of work, their stable keys, and what their role implies. */
export function finishSteps(drafts: readonly StepDraft[]): PlanStep[] {
  return drafts.map((draft, index) => {
    const { role, piece, fabricRole, params, lanes } = draft;
    const facts = ROLE_FACTS[role];
    const station = draft.station ?? facts.station;
    return {
      key: `${role}|${piece}|${fabricRole}`,
      role,
      position: index + 1,
      station,
      target: lanes.reduce((sum, lane) => sum + lane.target * madePerTap(lane), 0),
      title: { key: `ring.${role}.title`, params },
      why: { key: `ring.${role}.why`, params: {} },
      lanes,
      diagram: diagramOf(role),
      settings: draft.settings ?? null,
      cautions: station === 'chair' ? ['handNeedle'] : [...facts.cautions],
      mistakes: [...facts.mistakes],
    };
  });
}

/** Pieces or units that one tap of a lane makes. */
export function madePerTap(lane: PlanLane): number {
  return Object.values(lane.makes).reduce((sum, count) => sum + count, 0);
}

function diagramOf(role: StepDraft['role']): Diagram {
  return role === 'cut' ? 'ring.tumbling' : `ring.${role}`;
}
