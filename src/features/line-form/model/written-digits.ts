import type { DeclaredTyped, LineForm } from './form-types';
import { MUTUAL_KEYS, SEQUENCE_KEYS } from './form-types';
import { readNumber } from './number-text';

/** The digits of the declared values as typed, by JSON Pointer: 0.40 says more than 0.4. */
export function writtenDigits(form: LineForm): Record<string, string> {
  const digits: Record<string, string> = {};
  const note = (pointer: string, field: DeclaredTyped) => {
    const reading = readNumber(field.text);
    if (reading.kind === 'number') digits[`${pointer}/value`] = field.text.trim().replace('\u2212', '-');
  };
  form.declared.forEach((d, i) => SEQUENCE_KEYS.forEach((key) => note(`/declared/${i}/${key}`, d[key])));
  if (form.circuits === 2)
    MUTUAL_KEYS.forEach((key) => note(`/declaredMutual/0/${key}`, form.declaredMutual[key]));
  return digits;
}
