import type { Band } from '#shared/contracts/api.generated';
import { THIN_SPACE } from '#shared/format/numbers';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';

interface ShownClass {
  classKv: number;
  frequencyHz: number;
}

interface ClassChoiceProps {
  classes: readonly ShownClass[];
  shown: ShownClass | null;
  changed: readonly Band[];
  onChange: (shown: ShownClass) => void;
}

const keyOf = ({ classKv, frequencyHz }: ShownClass) => `${classKv}/${frequencyHz}`;

/** The voltage class and frequency on the table; those with changes say so. */
export function ClassChoice({ classes, shown, changed, onChange }: ClassChoiceProps) {
  const count = (of: ShownClass) => changed.filter((band) => keyOf(band) === keyOf(of)).length;
  const label = (of: ShownClass) => {
    const name = `${of.classKv}${THIN_SPACE}kV, ${of.frequencyHz}${THIN_SPACE}Hz`;
    return count(of) > 0 ? `${name}, ${count(of)} changed` : name;
  };
  return (
    <Field label="Voltage class" className="w-full field:w-56">
      {(ties) => (
        <Select
          {...ties}
          value={shown ? keyOf(shown) : ''}
          options={classes.map((of) => ({ value: keyOf(of), label: label(of) }))}
          onChange={(event) => {
            const next = classes.find((of) => keyOf(of) === event.target.value);
            if (next) onChange(next);
          }}
        />
      )}
    </Field>
  );
}
