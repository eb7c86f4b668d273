import * as fc from 'fast-check';

import { nextTimeMs } from '../../../sync/engine/clock';

it('follows the wall clock when that is ahead', () => {
  expect(nextTimeMs(5, 1000.7)).toBe(1000);
});

it('never goes back nor stands still, wherever the wall clock jumps', () => {
  fc.assert(
    fc.property(fc.array(fc.nat(1e12)), (clocks) => {
      let last = 0;
      for (const now of clocks) {
        const next = nextTimeMs(last, now);
        expect(next).toBeGreaterThan(last);
        last = next;
      }
    }),
  );
});
