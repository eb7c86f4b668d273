import type { PlanRefusal } from '../../../shared/model/plan';
import { planJson } from '../../../shared/plan/canonical-json';
import { makePlan } from '../../../shared/plan/make-plan';
import { parseRequest } from '../../../shared/plan/parse-request';
import type { Result } from '../../../shared/result';

/**
 * The plan of a request, in the one text form that the app computes too.
 *
 * @param json a request as it came, of any shape
 */
export function planText(
  json: unknown,
): Result<string, { kind: 'refused'; errors: PlanRefusal[] }> {
  const request = parseRequest(json);
  if (!request.ok) return request;
  const plan = makePlan(request.value);
  if (!plan.ok) return plan;
  return { ok: true, value: planJson(plan.value) };
}
