import { findReplacement } from '../../../shared/cutting/find-replacement';
import { defaultRequest } from '../../../shared/plan/default-request';
import { InvariantError } from '../../../shared/result';
import { choices, fabricsAToZ, fivePlates, planOf } from '../support/plans';

describe('where recut wedges come from', () => {
  it('takes the end of the wedge strip when it is long enough', () => {
    // one plate: an 8-inch length off a strip of 42
    const plan = planOf(defaultRequest(choices()));
    expect(findReplacement(plan, 'D', 2)).toEqual({
      from: 'offcut',
      letter: 'D',
      height: '4',
      left: '34',
      needed: '31/8',
    });
  });

  it('takes the lowest end that does, not the circle strip', () => {
    const plan = planOf(defaultRequest(choices()));
    expect(findReplacement(plan, 'A', 1)).toMatchObject({ from: 'offcut', height: '4' });
  });

  it('cuts another strip from the spare length when no end does', () => {
    const request = defaultRequest(choices({ blocks: 5, bladeMm: 60 }));
    const fabrics = request.fabrics.map((fabric) =>
      fabric.letter === 'D' ? { ...fabric, buyYards: '1/4' } : fabric,
    );
    expect(findReplacement(planOf({ ...request, fabrics }), 'D', 1)).toEqual({
      from: 'slack',
      letter: 'D',
      spare: '5',
      needed: '4',
    });
  });

  it('buys two strips when one does not hold the pieces', () => {
    expect(findReplacement(fivePlates(), 'D', 26)).toMatchObject({ from: 'buy', yards: '1/4' });
  });

  it('never lays a one-way print head to tail', () => {
    const fabrics = fabricsAToZ(5).map((fabric) => ({ ...fabric, oneWay: fabric.letter === 'D' }));
    const plan = planOf(defaultRequest(choices({ fabrics })));
    expect(findReplacement(plan, 'D', 2)).toMatchObject({ needed: '9/2' }); // 2 × 2.248461
  });

  it('knows only the plan’s fabrics', () => {
    expect(() => findReplacement(fivePlates(), 'Z', 1)).toThrow(InvariantError);
  });
});
