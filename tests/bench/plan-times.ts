import { defaultRequest } from '../../shared/plan/default-request';
import { makePlan } from '../../shared/plan/make-plan';
import { percentile, report } from './report';

const PLANS = 500;
const WARM_UP = 50;
const MOST_MS = 16; // one frame: the plan follows the typing

const request = defaultRequest({
  block: '12',
  blocks: 5,
  wedges: 20,
  tip: 'pointed',
  centre: 'circle',
  bladeMm: 60,
  fabrics: ['A', 'B', 'C', 'D', 'E', 'F'].map((letter) => ({
    letter,
    name: `Cloth ${letter}`,
    role: letter === 'F' ? 'background' : 'wedge',
    colour: '#E0AC35',
    oneWay: false,
    dominant: letter === 'B',
  })),
});

const times: number[] = [];
for (let made = 0; made < WARM_UP + PLANS; made += 1) {
  const began = performance.now();
  const plan = makePlan(request);
  if (made >= WARM_UP) times.push(performance.now() - began);
  if (!plan.ok) throw new Error(`no plan: ${JSON.stringify(plan.errors)}`);
}
const met = report('A plan of five plates of 20 wedges, in Node', [
  { name: 'makePlan, median', value: percentile(times, 0.5), unit: 'ms' },
  { name: 'makePlan, p95', value: percentile(times, 0.95), unit: 'ms', most: MOST_MS },
]);
process.exitCode = met ? 0 : 1;
