import {
  tumblingPieces,
  tumblingRun,
  windowStart,
} from '../../../../shared/geometry/drawing/tumbling';

/** 20 wedges, narrow edge at 1½ in, 4 in high: the look's own figures. */
const wedge = { narrowIn: 0.981386, wideIn: 2.248528, heightIn: 4, startIn: 0.25, oneWay: false };

describe('tumblingPieces', () => {
  it('takes 7.09 in of a length for 4 wedges', () => {
    expect(tumblingRun(tumblingPieces({ ...wedge, count: 4 }))).toBeCloseTo(7.0934, 3);
  });

  it('needs one wide edge and the pitch of the others, odd or even', () => {
    for (const count of [1, 2, 5, 8]) {
      const run = wedge.wideIn + ((count - 1) * (wedge.narrowIn + wedge.wideIn)) / 2;
      expect(tumblingRun(tumblingPieces({ ...wedge, count }))).toBeCloseTo(run, 9);
    }
  });

  it('shares each cut with the next wedge', () => {
    const [first, second] = tumblingPieces({ ...wedge, count: 2 });
    expect(second?.outline[0][0]).toBeCloseTo(first?.outline[1][0] ?? 0, 9);
    expect(second?.outline[3][0]).toBeCloseTo(first?.outline[2][0] ?? 0, 9);
  });

  it('turns every other wedge, but never a one-way print', () => {
    const top = ({ outline: [a, b] }: ReturnType<typeof tumblingPieces>[number]) => b[0] - a[0];
    const [first, second] = tumblingPieces({ ...wedge, count: 2 });
    expect(first && top(first)).toBeCloseTo(wedge.narrowIn, 9);
    expect(second && top(second)).toBeCloseTo(wedge.wideIn, 9);
    const oneWay = tumblingPieces({ ...wedge, count: 3, oneWay: true });
    expect(oneWay.map(top).every((width) => Math.abs(width - wedge.narrowIn) < 1e-9)).toBe(true);
    expect(tumblingRun(oneWay)).toBeCloseTo(3 * wedge.wideIn, 9);
  });
});

describe('windowStart', () => {
  it('shows all of what fits', () => {
    expect(windowStart(100, 200, 90)).toBe(0);
  });

  it('keeps the piece at hand in view and never passes an end', () => {
    expect(windowStart(300, 100, 20)).toBe(0);
    expect(windowStart(300, 100, 150)).toBe(100);
    expect(windowStart(300, 100, 290)).toBe(200);
  });
});
