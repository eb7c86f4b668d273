import { PlanSchema, type Plan } from '../model/plan';

/**
 * The one text of a plan: keys in the schema's order, byte for byte the same in app and server.
 *
 * @throws ZodError when the object is no plan
 */
export function planJson(plan: Plan): string {
  return JSON.stringify(PlanSchema.parse(plan));
}
