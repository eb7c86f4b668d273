import { exampleProjects } from '../../../shared/plan/example-projects';
import { readProgress } from '../../../shared/steps/read-progress';
import { planOf } from '../support/plans';

describe('the example', () => {
  const read = exampleProjects().map(({ name, request, counts }) => {
    const plan = planOf(request);
    const tallies = counts.map(({ want, ...key }) => ({ ...key, shown: want }));
    const { steps } = readProgress(plan.steps, [], tallies);
    return { name, request, steps: new Map(steps.map((step) => [step.role, step])) };
  });

  it('has three rings', () => {
    expect(
      read.map(({ name, request }) => [name, request.blocks, request.block, request.wedges]),
    ).toEqual([
      ['Harbour Lights', 3, '16', 16],
      ['Shed Window', 1, '14', 20],
      ['Pier Runner', 2, '10', 8],
    ]);
  });

  it('shows Harbour Lights with 24 of 48 wedges cut', () => {
    expect(read[0]?.steps.get('cut')).toMatchObject({ made: 24, target: 48 });
  });

  it('shows Shed Window at its pairs', () => {
    expect(read[1]?.steps.get('tip-turn')).toMatchObject({ toGo: 0 });
    expect(read[1]?.steps.get('pair')).toMatchObject({ made: 6, target: 8, ready: 2 });
  });

  it('shows Pier Runner with nothing cut', () => {
    expect([...(read[2]?.steps.values() ?? [])].every(({ made }) => made === 0)).toBe(true);
  });

  it('outruns nothing', () => {
    for (const { steps } of read) {
      for (const { role, outrun } of steps.values())
        expect({ role, outrun }).toEqual({ role, outrun: 0 });
    }
  });
});
