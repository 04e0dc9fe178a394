import { Field } from '../../../components/ui/field';
import { Checkbox, Select } from '../../../components/ui/inputs';
import { Button } from '../../../components/ui/button';
import { useLineFormView } from '../hooks/form-context';
import { changeSection, groundWiresOf, heightUnit, setGroundWires, setHeightUnit } from '../model/edit';
import type { SectionForm } from '../model/form-types';
import { readNumber } from '../model/number-text';
import { TEMPLATES, applyTemplate } from '../model/templates';
import { FieldGrid, FormPart } from './form-part';
import { PositionsTable } from './positions-table';

interface SectionPartProps {
  index: number;
  section: SectionForm;
}

/** Fills the positions from an arrangement; choosing one again fills them anew. */
function TemplateChoice({ index }: { index: number }) {
  const { form, change } = useLineFormView();
  const voltage = readNumber(form.nominalVoltageKv.text);
  const apply = (name: string) => {
    const template = TEMPLATES.find((t) => t.name === name);
    if (!template) return;
    const kv = voltage.kind === 'number' ? voltage.value : 230;
    change((f) => changeSection(f, index, (s) => applyTemplate(s, template.name, kv)));
  };
  return (
    <Field label="Fill from a structure" hint="starting values for the voltage; move each to what is built">
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
    <Field label="Lengths in">
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
  const { change } = useLineFormView();
  return (
    <Field label="Ground wires">
      {(ties) => (
        <Select
          {...ties}
          value={String(groundWiresOf(section).length)}
          onChange={(event) =>
            change((f) => changeSection(f, index, (s) => setGroundWires(s, Number(event.target.value))))
          }
          options={['none', '1', '2', '3', '4'].map((label, i) => ({ value: String(i), label }))}
        />
      )}
    </Field>
  );
}

/** Where phases and ground wires hang; or that the geometry is still owed. */
export function SectionGeometry({ index, section }: SectionPartProps) {
  const { set } = useLineFormView();
  const hasGeometry = ['sections', index, 'hasGeometry'] as const;
  if (!section.hasGeometry)
    return (
      <FormPart
        title="Positions at the structure"
        note="Without the geometry only physics and typical values can be checked, and the line owes it."
      >
        <Button onClick={() => set(hasGeometry, true)}>Enter the geometry</Button>
      </FormPart>
    );
  return (
    <FormPart
      title="Positions at the structure"
      note="From the centre line and above ground, of the bundle’s centre. In the drawing, drag a disc or move it with the arrow keys."
    >
      <FieldGrid>
        <TemplateChoice index={index} />
        <LengthsIn index={index} section={section} />
        <GroundWireCount index={index} section={section} />
        <div className="self-end pb-2">
          <Checkbox
            label="The geometry is not known yet"
            checked={false}
            onChange={() => set(hasGeometry, false)}
          />
        </div>
      </FieldGrid>
      <PositionsTable section={index} />
    </FormPart>
  );
}
