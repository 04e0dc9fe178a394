import { flushSync } from 'react-dom';
import { Field } from '../../../components/ui/field';
import { Checkbox, Select } from '../../../components/ui/inputs';
import { Button } from '../../../components/ui/button';
import { useLineFormView } from '../hooks/form-context';
import { useTakeBack } from '../hooks/take-back-context';
import { changeSection, groundWiresOf, heightUnit, setHeightUnit } from '../model/edit';
import { focusOn } from '../model/focus';
import type { LineForm, PositionForm, SectionForm } from '../model/form-types';
import { readNumber } from '../model/number-text';
import { backGroundWires, backPositions } from '../model/take-back';
import { TEMPLATES, applyTemplate, hangGroundWires } from '../model/templates';
import { FieldGrid, FormPart } from './form-part';
import { PositionsTable } from './positions-table';
import { TakeBackNotice } from './take-back-notice';

/** A voltage to begin with while none is entered, kV. */
const USUAL_KV = 230;

function voltageOf(form: LineForm): number {
  const voltage = readNumber(form.nominalVoltageKv.text);
  return voltage.kind === 'number' ? voltage.value : USUAL_KV;
}

interface SectionPartProps {
  index: number;
  section: SectionForm;
}

const TEMPLATE_ID = 'line-fill-from';
const GROUND_WIRES_ID = 'line-ground-wires';
const ENTER_ID = 'line-enter-geometry';

const isEntered = (p: PositionForm): boolean =>
  [p.horizontalM, p.attachmentHeightM, p.sagM].some(({ text }) => text.trim() !== '');

/** Fills the positions from an arrangement; choosing one again fills them anew. */
function TemplateChoice({ index, section }: SectionPartProps) {
  const { form, change } = useLineFormView();
  const { offer } = useTakeBack();
  const apply = (name: string) => {
    const template = TEMPLATES.find((t) => t.name === name);
    if (!template) return;
    const kv = voltageOf(form);
    if (section.positions.some(isEntered))
      offer({
        at: 'positions',
        words: `The positions that stood here are replaced by “${template.label}”.`,
        back: backPositions(section, index),
        focusId: TEMPLATE_ID,
      });
    change((f) => changeSection(f, index, (s) => applyTemplate(s, template.name, kv)));
  };
  return (
    <Field
      id={TEMPLATE_ID}
      label="Fill from a structure"
      hint="starting values for the voltage; move each to what is built"
    >
      {(ties) => (
        <Select {...ties} value="" onChange={(event) => apply(event.target.value)} none="Own positions">
          {TEMPLATES.filter((t) => t.circuits === form.circuits).map((t) => (
            <option key={t.name} value={t.name}>
              {t.label}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}

function LengthsIn({ index, section }: SectionPartProps) {
  const { change } = useLineFormView();
  return (
    <Field label="Lengths in" hint="the figures stay as they are typed">
      {(ties) => (
        <Select
          {...ties}
          value={heightUnit(section)}
          onChange={(event) =>
            change((f) => changeSection(f, index, (s) => setHeightUnit(s, event.target.value)))
          }
          options={[
            { value: 'm', label: 'metres' },
            { value: 'ft', label: 'feet' },
          ]}
        />
      )}
    </Field>
  );
}

function GroundWireCount({ index, section }: SectionPartProps) {
  const { form, change } = useLineFormView();
  const { offer, end } = useTakeBack();
  const choose = (count: number) => {
    const gone = groundWiresOf(section).slice(count);
    end();
    if (gone.some(isEntered))
      offer({
        at: 'positions',
        words: gone.length === 1 ? 'A ground wire is removed.' : `${gone.length} ground wires are removed.`,
        back: backGroundWires(section, index),
        focusId: GROUND_WIRES_ID,
      });
    change((f) => changeSection(f, index, (s) => hangGroundWires(s, count, voltageOf(form))));
  };
  return (
    <Field id={GROUND_WIRES_ID} label="Ground wires">
      {(ties) => (
        <Select
          {...ties}
          value={String(groundWiresOf(section).length)}
          onChange={(event) => choose(Number(event.target.value))}
          options={['none', '1', '2', '3', '4'].map((label, i) => ({ value: String(i), label }))}
        />
      )}
    </Field>
  );
}

/** Where phases and ground wires hang; or that the geometry is still owed. */
export function SectionGeometry({ index, section }: SectionPartProps) {
  const { set } = useLineFormView();
  const setHasGeometry = (has: boolean) => {
    // At once: what was pressed is gone, and the reader goes on where its place was.
    flushSync(() => set(['sections', index, 'hasGeometry'], has));
    focusOn(has ? TEMPLATE_ID : ENTER_ID);
  };
  if (!section.hasGeometry)
    return (
      <FormPart
        title="Positions at the structure"
        note="Without it only physics and typical values can be checked; the geometry is still owed."
      >
        <Button id={ENTER_ID} onClick={() => setHasGeometry(true)}>
          Enter the geometry
        </Button>
      </FormPart>
    );
  return (
    <FormPart
      title="Positions at the structure"
      note="From the centre line and above ground, of the bundle’s centre. In the drawing, drag a disc or move it with the arrow keys."
    >
      <FieldGrid>
        <TemplateChoice index={index} section={section} />
        <LengthsIn index={index} section={section} />
        <GroundWireCount index={index} section={section} />
        <div className="self-end pb-2">
          <Checkbox
            label="The geometry is not known yet"
            checked={false}
            onChange={() => setHasGeometry(false)}
          />
        </div>
      </FieldGrid>
      <TakeBackNotice at="positions" />
      <PositionsTable section={index} />
    </FormPart>
  );
}
