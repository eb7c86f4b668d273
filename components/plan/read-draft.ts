import type { SetupDraft } from '@/components/plan/draft';
import { findCircleLetter, letterFabrics } from '@/components/plan/draft-fabrics';
import { type FieldErrors, SIZE_FIELDS, type SizeField } from '@/components/plan/field-names';
import { readSize } from '@/components/plan/field-texts';
import { refusalText, typingText } from '@/components/plan/refusal-texts';
import { pointerToField } from '@/components/plan/pointer-to-field';
import type { Plan, PlanRefusal } from '@/shared/model/plan';
import type { PlanRequest, RequestFabric } from '@/shared/model/plan-request';
import type { Settings } from '@/shared/model/settings';
import { defaultRequest, type RingChoices } from '@/shared/plan/default-request';
import { makePlan } from '@/shared/plan/make-plan';
import type { Result } from '@/shared/result';

export type CuttingHabits = Pick<Settings, 'bladeMm' | 'cap'>;
export type DraftReading = Result<
  { request: PlanRequest; plan: Plan },
  { kind: 'refused'; errors: FieldErrors }
>;

type Sizes = Partial<Record<SizeField, string>>;

/** The sizes the maker typed herself, exact, and what is wrong with those that cannot be read. */
function readSizes(draft: SetupDraft): { sizes: Sizes; errors: FieldErrors } {
  const sizes: Sizes = {};
  const errors: FieldErrors = {};
  for (const field of SIZE_FIELDS) {
    const text = draft.texts[field];
    if (text === undefined || (field === 'overlap' && draft.centre === 'none')) continue;
    const read = readSize(field, text);
    if (read.ok) sizes[field] = read.value;
    else errors[field] = typingText(read.kind);
  }
  return { sizes, errors };
}

function readNames(fabrics: readonly RequestFabric[]): FieldErrors {
  const nameless = fabrics.flatMap(({ name }, at) => (name === '' ? [at] : []));
  return Object.fromEntries(nameless.map((at) => [`fabric:${at}`, typingText('no-name')]));
}

/**
 * A cap that the maker set for her own blade says nothing about another one, so it holds only
 * while the draft keeps to the blade of her settings.
 */
function chooseCutting(draft: SetupDraft, sizes: Sizes, habits: CuttingHabits) {
  const bladeMm = draft.bladeMm ?? habits.bladeMm;
  const usualCap = bladeMm === habits.bladeMm ? habits.cap : null;
  const cap = sizes.cap === undefined ? usualCap : Number(sizes.cap);
  return {
    bladeMm,
    ...(cap !== null && { cap }),
    ...(sizes.layers !== undefined && { layers: Number(sizes.layers) }),
  };
}

/** The choices behind a draft whose sizes can be read. */
function chooseRing(draft: SetupDraft, sizes: Sizes, habits: CuttingHabits): RingChoices {
  const { block = '16', blocks = '1', wedges = '16' } = sizes;
  const { tip, centre, circleEdge, press, applique, carried } = draft;
  return {
    ...carried,
    ...chooseCutting(draft, sizes, habits),
    block,
    blocks: Number(blocks),
    wedges: Number(wedges),
    tip,
    centre,
    circleEdge,
    press,
    applique,
    fabrics: letterFabrics(draft),
    circleFabric: findCircleLetter(draft) ?? undefined,
    stripHeight: sizes.stripHeight,
    narrowAt: sizes.narrowAt,
    seam: sizes.seam,
    circleOverlap: sizes.overlap,
    trimAllowance: sizes.trimAllowance,
    usableWidth: sizes.usableWidth,
    shrinkPercent: sizes.shrinkPercent,
  };
}

/** Leaves out purchases that have become too small: the offer taken was for another plan. */
function dropStaleOffers(request: PlanRequest, errors: readonly PlanRefusal[]): PlanRequest {
  const stale = errors.filter(({ code }) => code === 'buys-too-little');
  const fields = stale.map(({ pointer }) => pointerToField(pointer));
  const fabrics = request.fabrics.map((fabric, at): RequestFabric => {
    const { buyYards: _, ...plain } = fabric;
    return fields.includes(`fabric:${at}`) ? plain : fabric;
  });
  return { ...request, fabrics };
}

/** One text a field: the first of its refusals. */
function writeErrors(refusals: readonly PlanRefusal[]): FieldErrors {
  const errors: FieldErrors = {};
  for (const refusal of refusals) errors[pointerToField(refusal.pointer)] ??= refusalText(refusal);
  return errors;
}

function planRequest(request: PlanRequest): DraftReading {
  const made = makePlan(request);
  if (made.ok) return { ok: true, value: { request, plan: made.value } };
  const current = dropStaleOffers(request, made.errors);
  const again = makePlan(current);
  if (again.ok) return { ok: true, value: { request: current, plan: again.value } };
  return { ok: false, kind: 'refused', errors: writeErrors(again.errors) };
}

/** The request behind a draft; null when a size cannot be read. It may still be refused. */
export function requestOfDraft(draft: SetupDraft, habits: CuttingHabits): PlanRequest | null {
  const { sizes, errors } = readSizes(draft);
  if (Object.keys(errors).length > 0) return null;
  return defaultRequest(chooseRing(draft, sizes, habits));
}

/** Refusals that say something of their own field alone, whatever the others are. */
const OF_ONE_FIELD: readonly PlanRefusal['code'][] = [
  'not-positive',
  'below-least',
  'above-most',
  'too-few-fabrics',
  'too-many-fabrics',
  'narrow-edge-crossed',
  'shrink-too-large',
];

/** Plans a draft, or says beside which field what is wrong and what works. */
export function readDraft(draft: SetupDraft, habits: CuttingHabits): DraftReading {
  const { sizes, errors: unreadable } = readSizes(draft);
  const typed = { ...unreadable, ...readNames(letterFabrics(draft)) };
  const request = defaultRequest(chooseRing(draft, sizes, habits));
  if (Object.keys(typed).length === 0) return planRequest(request);
  const made = makePlan(request);
  const others = made.ok ? [] : made.errors.filter(({ code }) => OF_ONE_FIELD.includes(code));
  return { ok: false, kind: 'refused', errors: { ...writeErrors(others), ...typed } };
}
