import type { DraftFabric, SetupDraft } from '@/components/plan/draft';
import { ALWAYS_TYPED, SIZE_FIELDS, type SizeField } from '@/components/plan/field-names';
import { writeSize } from '@/components/plan/field-texts';
import { type CuttingHabits, requestOfDraft } from '@/components/plan/read-draft';
import type { PlanRequest, RequestFabric } from '@/shared/model/plan-request';

function toDraftFabric(fabric: RequestFabric): DraftFabric {
  const { letter, name, colour, oneWay, dominant, buyYards } = fabric;
  const plain = { id: fabric.role === 'wedge' ? `f${letter.charCodeAt(0)}` : fabric.role };
  return { ...plain, name, colour, oneWay, dominant, ...(buyYards && { buyYards }) };
}

/** A form filled in from a kept request, every size the request's own. */
function writeDraft(name: string, request: PlanRequest, background: RequestFabric): SetupDraft {
  const { centre, cutting, tip } = request;
  const circle = centre.shape === 'circle' ? centre : null;
  const cloth = request.fabrics.find(({ letter }) => letter === circle?.fabric);
  const own = request.fabrics.find(({ role }) => role === 'circle');
  const sizes = SIZE_FIELDS.map((field) => [field, writeSize(field, request)] as const);
  return {
    version: 1,
    name,
    texts: Object.fromEntries(sizes.filter(([, text]) => text !== '')),
    tip: tip.shape,
    centre: centre.shape,
    circleFabric: cloth ? toDraftFabric(cloth).id : null,
    wedgeFabrics: request.fabrics.filter(({ role }) => role === 'wedge').map(toDraftFabric),
    background: toDraftFabric(background),
    circleCloth: own ? toDraftFabric(own) : null,
    bladeMm: cutting.bladeMm,
    press: request.press,
    applique: request.applique,
    circleEdge: circle?.edge ?? 'turned',
    carried: {
      tipTurning: tip.shape === 'pointed' ? tip.seam : tip.turnUnder,
      ...(centre.shape === 'none' && { holeTurnUnder: centre.turnUnder }),
      ...(circle && { circleTurning: circle.turning }),
      squaringOff: cutting.squaringOff,
    },
  };
}

/** Lets a size follow its default again where that comes to the same. */
function letFollow(draft: SetupDraft, field: SizeField, habits: CuttingHabits): SetupDraft {
  if (ALWAYS_TYPED.includes(field)) return draft;
  const { [field]: own, ...texts } = draft.texts;
  const following = { ...draft, texts };
  const request = requestOfDraft(following, habits);
  return request && own === writeSize(field, request) ? following : draft;
}

/**
 * A form that plans the same quilt as a kept request. Sizes that are at their defaults go on
 * following them, so that a larger block in the copy gets a larger ring.
 *
 * @returns null for a request without a background, which cannot be planned
 */
export function draftFromRequest(
  name: string,
  request: PlanRequest,
  habits: CuttingHabits,
): SetupDraft | null {
  const background = request.fabrics.find(({ role }) => role === 'background');
  if (!background) return null;
  const typed = writeDraft(name, request, background);
  return SIZE_FIELDS.reduce((draft, field) => letFollow(draft, field, habits), typed);
}
