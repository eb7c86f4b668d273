import type { PlanRequest } from '../model/plan-request';
import { tippedName } from './piece-name';
import { lane, NEEDLE, PIECING_MM, type StepDraft } from './step-draft';

const TRIMMED_TO = '1/8';

/**
 * Tips, fabric by fabric: sewn in a chain, trimmed and turned when pointed; only turned, over a
 * template, when rounded; none when flat.
 *
 * @param letters the fabric of every wedge of one plate
 */
export function tipSteps(request: PlanRequest, letters: readonly string[]): StepDraft[] {
  const { tip } = request;
  if (tip.shape === 'flat') return [];
  const piece = tippedName(request);
  const lanes = (from: string, to: string) => tipLanes(request, letters, from, to);
  const turned = tip.shape === 'pointed' ? 'tip-trimmed' : 'wedge';
  const turn: StepDraft = {
    role: 'tip-turn',
    piece,
    fabricRole: 'wedge',
    params: { shape: tip.shape },
    lanes: lanes(turned, 'tip'),
  };
  if (tip.shape === 'rounded') return [turn];
  return [
    {
      role: 'tip-sew',
      piece,
      fabricRole: 'wedge',
      params: { seam: tip.seam },
      lanes: lanes('wedge', 'tip-sewn'),
      settings: { stitchMm: PIECING_MM, needle: NEEDLE, seam: tip.seam },
    },
    {
      role: 'tip-trim',
      piece,
      fabricRole: 'wedge',
      params: { trimmed: TRIMMED_TO },
      lanes: lanes('tip-sewn', 'tip-trimmed'),
    },
    turn,
  ];
}

function tipLanes(
  { fabrics, blocks }: PlanRequest,
  letters: readonly string[],
  from: string,
  to: string,
): StepDraft['lanes'] {
  return fabrics.flatMap(({ letter }) => {
    const wedges = letters.filter((other) => other === letter).length;
    if (wedges === 0) return [];
    return [lane(letter, wedges * blocks, { [`${from}:${letter}`]: 1 }, `${to}:${letter}`)];
  });
}
