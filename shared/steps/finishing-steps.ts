import type { PlanGeometry } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { toFraction, toText } from '../units/fraction';
import { circleName, tippedName } from './piece-name';
import { lane, NEEDLE, PIECING_MM, type StepDraft } from './step-draft';

const CIRCLE_MM = '9/5';
const STAY_STITCH_MM = '2';

/** From the pressed ring to the trimmed block: circle, background, appliqué, trimming. */
export function finishingSteps(request: PlanRequest, geometry: PlanGeometry): StepDraft[] {
  return [
    ...circleSteps(request, geometry),
    ...backgroundSteps(request, geometry),
    ...staySteps(request),
    applique(request),
    blockTrim(request, geometry),
  ];
}

function circleSteps({ centre, blocks }: PlanRequest, { circle }: PlanGeometry): StepDraft[] {
  if (centre.shape === 'none' || !circle) return [];
  const base = { piece: circleName(centre, circle), fabricRole: 'circle' } as const;
  return [
    {
      ...base,
      role: 'circle-cut',
      params: { diameter: circle.cutDiameter.cut, square: circle.square },
      lanes: [lane(centre.fabric, blocks, {}, 'circle')],
    },
    {
      ...base,
      role: 'circle-turn',
      params:
        centre.edge === 'turned' ? { edge: 'turned', turning: centre.turning } : { edge: 'fused' },
      lanes: [lane(centre.fabric, blocks, { circle: 1 }, 'circle-ready')],
    },
  ];
}

function backgroundSteps(
  { background: { fabric }, blocks }: PlanRequest,
  { background: { cut } }: PlanGeometry,
): StepDraft[] {
  const base = { piece: `background ${cut}`, fabricRole: 'background' } as const;
  return [
    {
      ...base,
      role: 'background-cut',
      params: { cut },
      lanes: [lane(fabric, blocks, {}, 'background')],
    },
    {
      ...base,
      role: 'background-fold',
      params: { cut },
      lanes: [lane(fabric, blocks, { background: 1 }, 'background-folded')],
    },
  ];
}

/** An open centre is on the bias all round: a line of small stitches keeps it from stretching. */
function staySteps(request: PlanRequest): StepDraft[] {
  const { centre, blocks } = request;
  if (centre.shape === 'circle') return [];
  return [
    {
      role: 'stay-stitch',
      piece: tippedName(request),
      fabricRole: 'wedge',
      params: { turnUnder: centre.turnUnder },
      lanes: [lane('ring-stayed', blocks, { 'ring-pressed': 1 }, 'ring-stayed')],
      settings: { stitchMm: STAY_STITCH_MM, needle: NEEDLE },
    },
  ];
}

function applique(request: PlanRequest): StepDraft {
  const withCircle = request.centre.shape === 'circle';
  const consumes: Record<string, number> = withCircle
    ? { 'ring-pressed': 1, 'circle-ready': 1, 'background-folded': 1 }
    : { 'ring-stayed': 1, 'background-folded': 1 };
  const byMachine = request.applique === 'machine';
  return {
    role: 'applique',
    piece: tippedName(request),
    fabricRole: 'block',
    params: { by: request.applique, centre: request.centre.shape },
    lanes: [lane('plate', request.blocks, consumes, 'plate')],
    station: byMachine ? 'machine' : 'chair',
    settings: byMachine ? { stitchMm: withCircle ? CIRCLE_MM : PIECING_MM, needle: NEEDLE } : null,
  };
}

function blockTrim({ blocks }: PlanRequest, { background: { trim } }: PlanGeometry): StepDraft {
  return {
    role: 'block-trim',
    piece: `block ${trim}`,
    fabricRole: 'block',
    params: { trim, fromCentre: toText(toFraction(trim).div(2)) },
    lanes: [lane('block', blocks, { plate: 1 }, 'block')],
  };
}
