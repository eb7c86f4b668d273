import type { RefusalCode } from '../model/codes';
import type { Message, PlanRefusal } from '../model/plan';

/** One reason to refuse a request. @param pointer JSON pointer of the field, "" for the whole */
export function refuse(
  pointer: string,
  code: RefusalCode,
  params: Message['params'] = {},
): PlanRefusal {
  return { pointer, code, params };
}
