import * as fc from 'fast-check';

import { defaultCap } from '../../../shared/stacks/default-cap';
import { layerOrder } from '../../../shared/stacks/layer-order';
import { splitEvenly } from '../../../shared/stacks/split-evenly';
import { stackGroups } from '../../../shared/stacks/stack-groups';
import { InvariantError } from '../../../shared/result';
import { defaultRequest } from '../../../shared/plan/default-request';
import { choices, fabricsAToZ, planOf } from '../support/plans';

describe('stacks', () => {
  it('are capped by the blade: 18 mm 1, 28 mm 2, 45 mm 4, 60 mm 6', () => {
    expect(([18, 28, 45, 60] as const).map(defaultCap)).toEqual([1, 2, 4, 6]);
  });

  it('of five fabrics at cap 4 are three and two', () => {
    expect(splitEvenly(['A', 'B', 'C', 'D', 'E'], 4)).toEqual([
      ['A', 'B', 'C'],
      ['D', 'E'],
    ]);
    expect(splitEvenly([], 4)).toEqual([]);
    expect(() => splitEvenly(['A'], 0)).toThrow(InvariantError);
  });

  it('are as few and as even as possible', () => {
    fc.assert(
      fc.property(fc.nat({ max: 40 }), fc.integer({ min: 1, max: 12 }), (count, cap) => {
        const things = Array.from({ length: count }, (_, index) => index);
        const sizes = splitEvenly(things, cap).map((group) => group.length);
        expect(splitEvenly(things, cap).flat()).toEqual(things);
        expect(sizes).toHaveLength(Math.ceil(count / cap));
        if (count > 0) expect(Math.max(...sizes) - Math.min(...sizes)).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('lie with the lightest fabric on top, by L*', () => {
    const fabrics = fabricsAToZ(3).map((fabric, index) => ({
      ...fabric,
      // L* 32, 98 and 46: a saturated blue is darker than it looks in a list of numbers
      colour: ['#0000FF', '#FFFF00', '#FF0000'][index % 3] ?? '#000000',
    }));
    expect(layerOrder(fabrics.slice(0, 3))).toEqual(['B', 'C', 'A']);
  });

  it('keep the order of the list between equal fabrics', () => {
    const fabrics = fabricsAToZ(3).map((fabric) => ({ ...fabric, colour: '#808080' }));
    expect(layerOrder(fabrics)).toEqual(['A', 'B', 'C', 'D']);
  });

  it('never mix one-way prints with fabrics whose wedges tumble', () => {
    const fabrics = fabricsAToZ(4)
      .slice(0, 4)
      .map((fabric) => ({ ...fabric, oneWay: fabric.letter === 'B' || fabric.letter === 'D' }));
    const letters = ['A', 'B', 'C', 'D', 'A', 'B', 'C', 'D', 'A'];
    const groups = stackGroups(fabrics, letters, 6);
    expect(
      groups.map((group) => [
        group.fabrics.map(({ letter }) => letter).join(''),
        group.oneWay,
        group.cutsPerPlate,
      ]),
    ).toEqual([
      ['AC', false, 3],
      ['BD', true, 2],
    ]);
  });

  it('of more fabrics than the cap are cut group by group', () => {
    const plan = planOf(defaultRequest(choices()));
    expect(plan.stacks).toEqual([
      { layers: ['A', 'B', 'C'], count: 1, cutsEach: 4, perCut: 3, pieces: 12 },
      { layers: ['D', 'E'], count: 1, cutsEach: 4, perCut: 2, pieces: 8 },
    ]);
  });

  it('give a last stack of fewer cuts a row of its own', () => {
    // seven wedges a plate, 49 in all; 25 to a strip, so two whole strips
    const plan = planOf(defaultRequest(choices({ blocks: 7, fabrics: fabricsAToZ(3) })));
    expect(plan.stacks.map(({ count, cutsEach }) => [count, cutsEach])).toEqual([
      [1, 25],
      [1, 24],
    ]);
    const cut = plan.steps.find(({ role }) => role === 'cut');
    expect(cut?.lanes[0]).toMatchObject({ target: 49 });
    expect(Object.values(cut?.lanes[0]?.consumes ?? {})).toEqual(['1/25']);
  });
});
