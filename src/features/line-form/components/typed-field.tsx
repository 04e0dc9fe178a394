import { NumberField } from '../../../components/ui/number-field';
import { useTypedField } from '../hooks/use-field';
import type { FormPath } from '../model/form-types';
import { pointerOf } from '../model/pointers';
import type { UnitChoice } from '../model/unit-choices';
import { PutHere } from './put-notice';

interface TypedFieldProps {
  path: FormPath;
  label: string;
  labelHidden?: boolean;
  /** What the number may be written in, or the one sign of its unit. */
  units?: readonly UnitChoice[] | string;
  hint?: string;
  optional?: boolean;
  placeholder?: string;
}

/** A number as it is typed, with its unit, its hint and what is wrong with it. */
export function TypedField({ path, units, hint, ...rest }: TypedFieldProps) {
  const { ties, text, unit, onText, onUnit } = useTypedField(path);
  const { hint: bandHint, ...control } = ties;
  const chooser =
    typeof units === 'string' || units === undefined
      ? units
      : {
          value: unit,
          onChange: onUnit,
          options: units.map((u) => ({ value: u.unit, label: u.label })),
        };
  const hints = [bandHint, hint].filter(Boolean).join('; ') || undefined;
  return (
    <div className="min-w-0">
      <NumberField {...rest} {...control} value={text} onChange={onText} unit={chooser} hint={hints} />
      <PutHere pointer={pointerOf(path)} />
    </div>
  );
}
