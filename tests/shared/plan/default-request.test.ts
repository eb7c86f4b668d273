import { chordMargin } from '../../../shared/geometry/chord-margin';
import { defaultRequest } from '../../../shared/plan/default-request';
import { makePlan } from '../../../shared/plan/make-plan';
import { choices, planOf } from '../support/plans';

describe('the default strip height', () => {
  it('takes a ring to 3/4 inch from the side', () => {
    const request = defaultRequest(choices({ block: '16', wedges: 16, tip: 'flat' }));
    expect(request.stripHeight).toBe('11/2'); // 8 - 3/4 + 1/4 - 2, by hand
  });

  it('keeps the corners of five flat wedges inside the block, and no eighth more', () => {
    const request = defaultRequest(choices({ block: '16', wedges: 5, tip: 'flat' }));
    // by hand: 8 cos 36 deg = 6.472136; + 1/4 - 2 = 4.722136, down to 4 5/8
    expect(request.stripHeight).toBe('37/8');
    expect(chordMargin(16, 2 + 4.625 - 0.25, 5)).toBeGreaterThan(0);
    expect(chordMargin(16, 2 + 4.75 - 0.25, 5)).toBeLessThan(0);
    expect(planOf(request).geometry.wedge.stripHeight).toBe('37/8');
  });

  it.each(['pointed', 'rounded', 'flat'] as const)(
    'can be planned for a %s tip and any count',
    (tip) => {
      for (let wedges = 5; wedges <= 60; wedges += 1) {
        const plan = makePlan(defaultRequest(choices({ block: '16', wedges, tip })));
        expect({ wedges, ok: plan.ok }).toEqual({ wedges, ok: true });
      }
    },
  );
});
