import type { ChangeEvent } from 'react';
import { getAt } from '../model/edit';
import type { FormPath, Typed } from '../model/form-types';
import { fieldId, pointerOf } from '../model/pointers';
import { useLineFormView } from './form-context';

/** The ties of one field to the form: id, note, and what follows its focus. */
export function useFieldTies(path: FormPath) {
  const view = useLineFormView();
  const pointer = pointerOf(path);
  const note = view.noteAt(pointer);
  return {
    id: fieldId(pointer),
    error: note?.message ?? null,
    hint: view.hintAt(pointer),
    onFocus: () => view.enter(pointer),
    onBlur: () => view.leave(pointer),
  };
}

/** A field that holds a text. */
export function useTextField(path: FormPath) {
  const view = useLineFormView();
  const { hint, error, ...ties } = useFieldTies(path);
  const value = getAt(view.form, path);
  return {
    field: { id: ties.id, error, hint },
    input: {
      value: typeof value === 'string' ? value : '',
      onChange: (event: ChangeEvent<HTMLInputElement | HTMLSelectElement>) =>
        view.set(path, event.target.value),
      onFocus: ties.onFocus,
      onBlur: ties.onBlur,
    },
  };
}

const isTyped = (value: unknown): value is Typed =>
  typeof value === 'object' && value !== null && 'text' in value && 'unit' in value;

/** A field that holds a number as typed with the unit chosen for it. */
export function useTypedField(path: FormPath) {
  const view = useLineFormView();
  const ties = useFieldTies(path);
  const value = getAt(view.form, path);
  const typed = isTyped(value) ? value : { text: '', unit: '' };
  return {
    ties,
    text: typed.text,
    unit: typed.unit,
    onText: (event: ChangeEvent<HTMLInputElement>) => view.set([...path, 'text'], event.target.value),
    onUnit: (event: ChangeEvent<HTMLSelectElement>) => view.set([...path, 'unit'], event.target.value),
  };
}
