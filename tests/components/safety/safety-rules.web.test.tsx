import { checkLines } from '@/components/safety/check-lines';
import {
  AWAY_MS,
  canSkip,
  type CuttingVisit,
  isCutting,
  needsCheck,
} from '@/components/safety/safety-rules';
import { STEP_ROLES } from '@/shared/model/codes';

const START_MS = 1_800_000_000_000;
const visit = (part: Partial<CuttingVisit> = {}): CuttingVisit => ({
  opened: 'checked',
  adult: false,
  lastSeenAtMs: START_MS,
  ...part,
});

it('opens the check at the first cut', () => {
  expect(needsCheck(null, false, START_MS)).toBe(true);
});

it('leaves her alone until she was 30 minutes away', () => {
  expect(needsCheck(visit(), false, START_MS + AWAY_MS - 1)).toBe(false);
  expect(needsCheck(visit(), false, START_MS + AWAY_MS)).toBe(true);
});

it('remembers a skip for the visit, and for no longer', () => {
  expect(needsCheck(visit({ opened: 'skipped' }), false, START_MS + 60_000)).toBe(false);
  expect(needsCheck(visit({ opened: 'skipped' }), false, START_MS + AWAY_MS)).toBe(true);
});

it('opens again when the clock was set back past the visit', () => {
  expect(needsCheck(visit(), false, START_MS - 60_000)).toBe(false);
  expect(needsCheck(visit(), false, START_MS - AWAY_MS - 1)).toBe(true);
});

it('asks for the adult once someone under 18 cuts, in the middle of a visit too', () => {
  expect(needsCheck(visit(), true, START_MS)).toBe(true);
  expect(needsCheck(visit({ adult: true }), true, START_MS)).toBe(false);
});

it('has seven lines, and an eighth that cannot be skipped when someone under 18 cuts', () => {
  expect(checkLines(false)).toHaveLength(7);
  expect(checkLines(true).map(({ id }) => id)).toContain('adult');
  expect(checkLines(true)).toHaveLength(8);
  expect(canSkip(false)).toBe(true);
  expect(canSkip(true)).toBe(false);
});

it('belongs to the steps that cut', () => {
  expect(STEP_ROLES.filter(isCutting)).toEqual([
    'strip',
    'length',
    'cut',
    'tip-trim',
    'circle-cut',
    'background-cut',
    'block-trim',
  ]);
});
