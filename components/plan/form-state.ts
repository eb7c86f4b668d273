import type { SetupDraft } from '@/components/plan/draft';
import type { FieldErrors, FieldName, SizeField } from '@/components/plan/field-names';

/** The form: what was typed, where she is typing, and beside which fields an error has stood. */
export interface FormState {
  draft: SetupDraft;
  typing: FieldName | 'name' | null;
  known: readonly FieldName[];
}

export type FormAct =
  | { act: 'type'; field: SizeField; text: string; errors: FieldErrors }
  | { act: 'name'; text: string; errors: FieldErrors }
  | { act: 'leave' }
  | { act: 'change'; change: (draft: SetupDraft) => SetupDraft };

function startTyping(state: FormState, field: FormState['typing'], errors: FieldErrors): FormState {
  if (state.typing !== null) return { ...state, typing: field };
  const wrong = Object.keys(errors) as FieldName[];
  return { ...state, typing: field, known: [...new Set([...state.known, ...wrong])] };
}

export function reduceForm(state: FormState, act: FormAct): FormState {
  switch (act.act) {
    case 'type': {
      const texts = { ...state.draft.texts, [act.field]: act.text };
      const draft = { ...state.draft, texts };
      return { ...startTyping(state, act.field, act.errors), draft };
    }
    case 'name': {
      const draft = { ...state.draft, name: act.text };
      return { ...startTyping(state, 'name', act.errors), draft };
    }
    case 'leave':
      return { ...state, typing: null };
    case 'change':
      return { ...state, typing: null, draft: act.change(state.draft) };
  }
}

/**
 * The errors to show: all of them, but while she types only beside fields that were wrong before,
 * so that a half-typed size is not scolded and a mended one is praised at once.
 */
export function pickShownErrors({ typing, known }: FormState, errors: FieldErrors): FieldErrors {
  if (typing === null) return errors;
  const shown = Object.entries(errors).filter(([field]) => known.includes(field as FieldName));
  return Object.fromEntries(shown);
}
