import type { Describe } from '@/components/diagrams/describe';
import { cutRun, stackRun } from '@/shared/geometry/drawing/cut-run';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import { lengthBatch } from '@/shared/geometry/drawing/length-batch';
import type { StepRole } from '@/shared/model/codes';
import { formatExact, formatInches } from '@/shared/units/format-fraction';

type CuttingRole = Extract<
  StepRole,
  'strip' | 'length' | 'stack' | 'cut' | 'circle-cut' | 'background-cut'
>;

/** "2 cut, next is 3." */
function progress(done: number, count: number): string {
  if (done >= count) return count === 1 ? 'It is cut.' : `All ${count} cut.`;
  return done === 0
    ? `Next is ${count === 1 ? 'the only one' : '1'}.`
    : `${done} cut, next is ${done + 1}.`;
}

const strip: Describe = (plan, lane, done) => {
  const letter = laneLetters(lane)[0];
  const of = letter === undefined ? '' : ` of ${letter}`;
  const target = lane?.target ?? 1;
  return `${target === 1 ? 'A strip' : `${target} strips`}${of}, ${formatInches(plan.geometry.wedge.stripHeight)} high, across the ${formatInches(plan.request.cloth.usableWidth)} of the cloth. The ruler lies on the strip you keep. ${progress(done, target)}`;
};

const length: Describe = (plan, lane, done) => {
  const batch = lengthBatch(plan, lane, done);
  return `A strip of ${batch.letter}, ${formatInches(plan.geometry.wedge.stripHeight)} high. ${batch.count === 1 ? 'A length' : `${batch.count} lengths`} of ${formatInches(batch.length)} from it. ${progress(batch.done, batch.count)}`;
};

const stack: Describe = (plan, lane) => {
  const { layers } = stackRun(plan, lane);
  if (layers.length === 1) return `One layer: ${layers.join('')}.`;
  return `${layers.length} layers, lightest on top: ${layers.join(', ')}. Same grain, edges together.`;
};

const cut: Describe = (plan, lane, done) => {
  const run = cutRun(plan, lane, done);
  const { wedge } = plan.geometry;
  const strips = plan.fabrics.find(({ letter }) => letter === run.layers[0])?.strips ?? [];
  const long = strips.find((row) => row.for === 'wedge')?.length;
  const pieces =
    long === undefined
      ? `A length ${formatInches(wedge.stripHeight)} high.`
      : `A length of ${formatInches(long)}, ${formatInches(wedge.stripHeight)} high.`;
  const oneWay = plan.request.fabrics.some((f) => f.oneWay && run.layers.includes(f.letter));
  const turned = run.pieces.length === 1 || oneWay ? '' : ', every other one turned';
  const count = run.pieces.length === 1 ? '1 wedge' : `${run.pieces.length} wedges`;
  return `${pieces} ${count}${turned}, ${formatExact(wedge.cutNarrow.exact)} in narrow and ${formatExact(wedge.cutWide.exact)} in wide. ${progress(run.done, run.pieces.length)}`;
};

const circleCut: Describe = (plan, lane, done) => {
  const { circle } = plan.geometry;
  if (!circle) return 'No centre circle: the hole stays open.';
  return `A circle ${formatInches(circle.cutDiameter.cut)} across, drawn on a ${formatInches(circle.square)} square. ${progress(done, lane?.target ?? 1)}`;
};

const backgroundCut: Describe = (plan, lane, done) => {
  const { cut: side } = plan.geometry.background;
  return `A square of ${plan.request.background.fabric}, ${formatInches(side)} each way, from a strip as wide as the cloth. ${progress(done, lane?.target ?? 1)}`;
};

/** What is cut, in words. */
export const describeCutting: Record<CuttingRole, Describe> = {
  strip,
  length,
  stack,
  cut,
  'circle-cut': circleCut,
  'background-cut': backgroundCut,
};
