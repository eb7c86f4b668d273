import { enoughText } from '@/components/station/enough-text';
import type { LaneProgress, StepProgress } from '@/shared/model/tally';

/** A lane of tips in one fabric: twenty to make, so many made, so many possible now. */
function tips(letter: string, done: number, possible: number): LaneProgress {
  const makes = { [`tip-sewn:${letter}`]: 1 };
  const lane = { key: letter, target: 20, consumes: { [`wedge:${letter}`]: 1 }, makes };
  return { lane, extra: false, done, possible, perTap: 1 };
}

function stepOf(lanes: LaneProgress[]): StepProgress {
  return {
    key: 'tip-sew',
    role: 'tip-sew',
    position: 5,
    station: 'machine',
    target: lanes.length * 20,
    made: 0,
    lost: 0,
    good: 0,
    toGo: lanes.length * 20,
    ready: 0,
    outrun: 0,
    lanes,
    waitingFor: [{ item: 'wedge:D', missing: 20 }],
  };
}

it('names what each lane allows', () => {
  const step = stepOf([tips('A', 0, 20), tips('D', 0, 19)]);
  expect(enoughText(step, null)).toBe('Enough for 20 tips A and 19 D');
});

it('leaves out a lane that nothing is on hand for', () => {
  const step = stepOf([tips('A', 0, 20), tips('D', 0, 0)]);
  expect(enoughText(step, null)).toBe('Enough on hand for 20 more A');
});

it('says what is waited for when no lane can go on', () => {
  expect(enoughText(stepOf([tips('A', 20, 0), tips('D', 0, 0)]), null)).toBe(
    'Waiting for 20 wedges in D',
  );
});
