import { useState } from 'react';
import { getAt, setAt } from '../model/edit';
import type { LineForm } from '../model/form-types';
import { pathOf } from '../model/pointers';
import { putCorrection } from '../model/put-values';
import { putWords } from '../model/put-words';
import type { Correction, PutValue } from '../model/put-values';
import type { LineEditor } from './use-line-editor';

/** Values that were put in and wait for a word. */
export interface StandingPut {
  values: readonly PutValue[];
  keep: () => void;
  undo: () => void;
}

interface Standing {
  values: PutValue[];
  before: LineForm;
}

/** Corrections that the check offers: put into the form, then kept or taken back by the applicant. */
export function usePut(editor: Pick<LineEditor, 'form' | 'change'>) {
  const [standing, setStanding] = useState<Standing | null>(null);
  const put = (correction: Correction, circuit: number | undefined) => {
    const { form, values } = putCorrection(editor.form, correction, circuit ?? 1);
    const [first] = values;
    if (!first) return;
    setStanding({ values, before: editor.form });
    editor.change(() => form);
  };
  const undo = () => {
    if (!standing) return;
    editor.change((form) =>
      standing.values.reduce((next, { pointer }) => {
        const path = pathOf(pointer);
        return setAt(next, path, getAt(standing.before, path));
      }, form),
    );
    setStanding(null);
  };
  const offer = (correction: Correction, circuit: number | undefined) =>
    putWords(editor.form, correction, circuit ?? 1);
  const notice = standing && { values: standing.values, keep: () => setStanding(null), undo };
  return { put, offer, notice };
}
