import { Checkbox } from '../../../components/ui/inputs';
import { SegmentChoice } from '../../../components/ui/segment';
import { useLineFormView } from '../hooks/form-context';
import { setCircuits } from '../model/edit';
import { FieldGrid, FormPart } from './form-part';
import { ChoiceField, TextField } from './text-fields';
import { TypedField } from './typed-field';

const FREQUENCIES = [
  { value: '50', label: '50 Hz' },
  { value: '60', label: '60 Hz' },
];

const COUNTS = [
  { value: '1', label: 'One' },
  { value: '2', label: 'Two' },
] as const;

/** Circuits on the structure; the second one starts with the first one's conductors. */
function Circuits() {
  const { form, change } = useLineFormView();
  return (
    <div className="field">
      <span className="field-label" aria-hidden="true">
        Circuits on the structure
      </span>
      <SegmentChoice
        label="Circuits on the structure"
        value={form.circuits === 2 ? '2' : '1'}
        onChange={(value: '1' | '2') => change((f) => setCircuits(f, value === '2' ? 2 : 1))}
        options={COUNTS}
      />
    </div>
  );
}

/** What the line is called, where it runs, its voltage. */
export function LineIdentity() {
  const { form, set, classesKv } = useLineFormView();
  const classes = classesKv.length > 0 ? `classes: ${classesKv.join(', ')} kV` : undefined;
  return (
    <FormPart title="Line" note="As in your single-line diagram.">
      <FieldGrid>
        <div className="field:col-span-2">
          <TextField path={['name']} label="Name" />
        </div>
        <TextField path={['from']} label="From" />
        <TextField path={['to']} label="To" />
        <TypedField path={['nominalVoltageKv']} label="Nominal voltage" units="kV" hint={classes} />
        <ChoiceField path={['frequencyHz']} label="Frequency" options={FREQUENCIES} />
        <Circuits />
        <div className="self-end pb-2">
          <Checkbox
            label="Phases are transposed"
            checked={form.transposed}
            onChange={(event) => set(['transposed'], event.target.checked)}
          />
        </div>
      </FieldGrid>
    </FormPart>
  );
}
