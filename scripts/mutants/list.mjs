import { CLOTH } from './list/cloth.mjs';
import { DRAWING } from './list/drawing.mjs';
import { GEOMETRY } from './list/geometry.mjs';
import { PLAN } from './list/plan.mjs';
import { RINGS } from './list/rings.mjs';
import { STEPS } from './list/steps.mjs';

/** Every seeded error: signs, ¼ for ½, tan for sin, off by one, ceil for floor, < for ≤. */
export const MUTANTS = [...GEOMETRY, ...CLOTH, ...RINGS, ...PLAN, ...STEPS, ...DRAWING];
