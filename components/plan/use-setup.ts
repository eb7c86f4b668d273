import { useCallback, useEffect, useMemo, useReducer, useState } from 'react';

import type { SetupDraft } from '@/components/plan/draft';
import { type FieldErrors, findFirstError, type SizeField } from '@/components/plan/field-names';
import { writeSize } from '@/components/plan/field-texts';
import { type FormState, pickShownErrors, reduceForm } from '@/components/plan/form-state';
import { type CuttingHabits, type DraftReading, readDraft } from '@/components/plan/read-draft';
import { useFocusRequest } from '@/components/plan/use-focus-request';

type Good = Extract<DraftReading, { ok: true }>['value'];

export interface Setup {
  draft: SetupDraft;
  /** the last plan that could be made, and whether it is the draft's */
  good: Good | null;
  current: boolean;
  errors: FieldErrors;
  /** what stands in a size's field: as typed, or the default it follows */
  shownText(field: SizeField): string;
  type(field: SizeField, text: string): void;
  typeName(text: string): void;
  leave(): void;
  change(update: (draft: SetupDraft) => SetupDraft): void;
  /** Shows every error and goes to the first wrong field; true when there is one. */
  showErrors(): boolean;
}

const START = { typing: null, known: [] } satisfies Omit<FormState, 'draft'>;

/** The live form: every change plans again, and the last good plan stays while something is wrong. */
export function useSetup(
  start: SetupDraft,
  habits: CuttingHabits,
  keep: (draft: SetupDraft) => void,
): Setup {
  const [state, dispatch] = useReducer(reduceForm, { ...START, draft: start });
  const { draft } = state;
  const { bladeMm, cap } = habits;
  const reading = useMemo(() => readDraft(draft, { bladeMm, cap }), [draft, bladeMm, cap]);
  const [lastGood, setLastGood] = useState<Good | null>(null);
  if (reading.ok && lastGood !== reading.value) setLastGood(reading.value);
  const good = reading.ok ? reading.value : lastGood;
  const all = reading.ok ? {} : reading.errors;
  const focus = useFocusRequest();
  useEffect(() => {
    if (draft !== start) keep(draft);
  }, [draft, start, keep]);
  const change = useCallback(
    (update: (draft: SetupDraft) => SetupDraft) => dispatch({ act: 'change', change: update }),
    [],
  );
  return {
    draft,
    good,
    current: reading.ok,
    errors: pickShownErrors(state, all),
    shownText: (field) => draft.texts[field] ?? (good ? writeSize(field, good.request) : ''),
    type: (field, text) => dispatch({ act: 'type', field, text, errors: all }),
    typeName: (text) => dispatch({ act: 'name', text, errors: all }),
    leave: () => dispatch({ act: 'leave' }),
    change,
    showErrors() {
      dispatch({ act: 'leave' });
      const first = findFirstError(all);
      if (first) focus(first);
      return first !== null;
    },
  };
}
