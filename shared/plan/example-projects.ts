import type { StepRole } from '../model/codes';
import type { PlanRequest, RequestFabric } from '../model/plan-request';
import type { TallyKey } from '../model/tally';
import { InvariantError } from '../result';
import { defaultRequest } from './default-request';
import { makePlan } from './make-plan';

/** A project of the example, with the counts it is shown at. */
export interface ExampleProject {
  name: string;
  note: string;
  request: PlanRequest;
  counts: (TallyKey & { want: number })[];
}

const CLOTH = {
  sailcloth: ['Sailcloth', '#EFE5D0'],
  lantern: ['Lantern', '#E0AC35'],
  tide: ['Tide', '#86AAB8'],
  buoy: ['Buoy', '#B04A37'],
  deepWater: ['Deep Water', '#263C69'],
  fog: ['Fog', '#DDE0D8'],
} as const;

/** Three rings in different states, the newest work first. */
export function exampleProjects(): ExampleProject[] {
  return [harbourLights(), shedWindow(), pierRunner()];
}

function harbourLights(): ExampleProject {
  const fabrics = fabricsOf(['sailcloth', 'lantern', 'tide', 'buoy'], 'fog');
  const request = defaultRequest({
    block: '16',
    blocks: 3,
    wedges: 16,
    tip: 'pointed',
    centre: 'circle',
    circleFabric: 'B',
    fabrics,
  });
  const counts = countsUpTo(request, 'cut', 0.5);
  return { name: 'Harbour Lights', note: 'Three plates for the raffle quilt', request, counts };
}

function shedWindow(): ExampleProject {
  const cloths = ['sailcloth', 'lantern', 'tide', 'buoy', 'deepWater'] as const;
  const request = defaultRequest({
    block: '14',
    blocks: 1,
    wedges: 20,
    tip: 'pointed',
    centre: 'circle',
    bladeMm: 60,
    fabrics: fabricsOf(cloths, 'fog').map((fabric) => ({
      ...fabric,
      dominant: fabric.letter === 'B',
    })),
  });
  const counts = countsUpTo(request, 'pair', 0.75);
  return { name: 'Shed Window', note: 'One plate, for the guild’s window', request, counts };
}

function pierRunner(): ExampleProject {
  const request = defaultRequest({
    block: '10',
    blocks: 2,
    wedges: 8,
    tip: 'pointed',
    centre: 'circle',
    fabrics: fabricsOf(['buoy', 'sailcloth'], 'deepWater'),
  });
  return { name: 'Pier Runner', note: 'Two small plates side by side', request, counts: [] };
}

function fabricsOf(
  wedges: readonly (keyof typeof CLOTH)[],
  background: keyof typeof CLOTH,
): RequestFabric[] {
  return [...wedges, background].map((cloth, index) => {
    const [name, colour] = CLOTH[cloth];
    const role = index < wedges.length ? 'wedge' : 'background';
    const letter = String.fromCharCode('A'.charCodeAt(0) + index);
    return { letter, name, role, colour, oneWay: false, dominant: false };
  });
}

/** Every step before one role full, and that one full up to a share, rounded down to whole taps. */
function countsUpTo(request: PlanRequest, role: StepRole, share: number): ExampleProject['counts'] {
  const plan = makePlan(request);
  if (!plan.ok) throw new InvariantError('an example that cannot be planned');
  const { steps } = plan.value;
  const last = steps.findIndex((step) => step.role === role);
  return steps.slice(0, last + 1).flatMap((step, index) =>
    step.lanes.map((lane) => ({
      step: step.key,
      lane: lane.key,
      kind: 'done' as const,
      want: index < last ? lane.target : Math.floor(lane.target * share),
    })),
  );
}
