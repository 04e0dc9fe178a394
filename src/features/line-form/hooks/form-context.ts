import { createContext, useContext } from 'react';
import type { Conductor } from '#shared/contracts/api.generated';
import type { FormPath, LineForm } from '../model/form-types';
import type { StandingPut } from './use-put';

/** What the check or the schema says at a field. */
export interface FieldNote {
  /** A fault stands in the way of filing; the other grades are findings. */
  grade: 'must-answer' | 'explain' | 'note';
  message: string;
  /** Nothing stands there yet. */
  missing?: boolean;
}

/** Everything that a field of the form needs to know about the form it stands in. */
export interface LineFormView {
  form: LineForm;
  /** Replaces one leaf. */
  set: (path: FormPath, value: unknown) => void;
  /** Replaces the form by another made from it. */
  change: (change: (form: LineForm) => LineForm) => void;
  /** Values that the check put in and that wait for a word. */
  put?: StandingPut | null;
  /** What is to be shown under a field now. */
  noteAt: (pointer: string) => FieldNote | null;
  /** The reader has come to a field, or has left it. */
  enter: (pointer: string) => void;
  leave: (pointer: string) => void;
  /** The hint under a field: its typical band, or the value in the filing's unit. */
  hintAt: (pointer: string) => string | undefined;
  conductors: readonly Conductor[];
  /** Resistivity assumed where none is entered, Ω·m. */
  ownersResistivityOhmM: number;
  /** Power base assumed where none is entered, MVA. */
  ownersBaseMva: number;
  /** Nominal voltages that the rules have bands for, kV. */
  classesKv: readonly number[];
}

export const LineFormContext = createContext<LineFormView | null>(null);

/** The form around a field. */
export function useLineFormView(): LineFormView {
  const view = useContext(LineFormContext);
  if (!view) throw new Error('A field of the line form stands outside a line form.');
  return view;
}
