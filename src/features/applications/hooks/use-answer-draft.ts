import { useEffect, useRef, useState } from 'react';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { useKeepAnswer } from '../api/keep-answer';

const PAUSE_MS = 1200;

export type AnswerBy = 'change' | 'explanation';

/** The words of an answer while they are written: kept on the server after each pause. */
export function useAnswerDraft(number: string, discrepancy: Discrepancy) {
  const [text, setText] = useState(discrepancy.draftAnswer ?? '');
  const [by, setBy] = useState<AnswerBy>(discrepancy.answeredBy ?? 'explanation');
  const [savedAt, setSavedAt] = useState<Date | null>(null);
  const keep = useKeepAnswer(number, discrepancy.number);
  const kept = useRef(discrepancy.draftAnswer ?? '');
  const { mutate, isPending } = keep;
  const { version } = discrepancy;

  useEffect(() => {
    if (isPending || text === kept.current || text.trim() === '') return;
    const timer = setTimeout(() => {
      mutate(
        { by, text, version },
        {
          onSuccess: () => {
            kept.current = text;
            setSavedAt(new Date());
          },
        },
      );
    }, PAUSE_MS);
    return () => clearTimeout(timer);
  }, [by, isPending, mutate, text, version]);

  return { text, setText, by, setBy, savedAt, error: keep.error, busy: isPending };
}
