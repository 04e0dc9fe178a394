import { Checkbox } from '../../../components/ui/inputs';
import { SegmentChoice } from '../../../components/ui/segment';
import { useLineFormView } from '../hooks/form-context';
import { useTakeBack } from '../hooks/take-back-context';
import { setCircuits } from '../model/edit';
import { backCircuit } from '../model/take-back';
import { FieldGrid, FormPart } from './form-part';
import { TakeBackNotice } from './take-back-notice';
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

const CIRCUITS_ID = 'line-circuits';

/** Circuits on the structure; the second one starts with the first one's conductors. */
function Circuits() {
  const { form, change } = useLineFormView();
  const { offer, end } = useTakeBack();
  const choose = (count: 1 | 2) => {
    if (count === form.circuits) return;
    end();
    if (count === 1)
      offer({
        at: 'circuits',
        words: 'Circuit 2 is removed, with its positions and values.',
        back: backCircuit(form),
        focusId: CIRCUITS_ID,
      });
    change((f) => setCircuits(f, count));
  };
  return (
    <div className="field" id={CIRCUITS_ID}>
      <span className="field-label" aria-hidden="true">
        Circuits on the structure
      </span>
      <SegmentChoice
        label="Circuits on the structure"
        value={form.circuits === 2 ? '2' : '1'}
        onChange={(value: '1' | '2') => choose(value === '2' ? 2 : 1)}
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
        <TakeBackNotice at="circuits" />
      </FieldGrid>
    </FormPart>
  );
}
