import { Button } from '../../../components/ui/button';
import { useLineFormView } from '../hooks/form-context';
import { proposedResistance } from '../model/area-resistance';
import { getAt } from '../model/edit';
import type { ConductorForm, FormPath } from '../model/form-types';
import { AREA_UNITS, DIAMETER_UNITS, GMR_UNITS, WIRE_RESISTANCE_UNITS } from '../model/unit-choices';
import { FieldGrid } from './form-part';
import { ChoiceField, TextField } from './text-fields';
import { TypedField } from './typed-field';

const MODELS = [
  { value: 'handbook', label: 'Handbook: a.c. resistance and GMR' },
  { value: 'tube', label: 'Tube: d.c. resistance and diameters' },
];

/** An area in place of a resistance: it proposes one, and the applicant puts it in. */
function AluminiumArea({ path }: { path: FormPath }) {
  const { form, set } = useLineFormView();
  const proposed = proposedResistance(getAt(form, path) as ConductorForm);
  return (
    <div className="grid min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-2 [&>button]:justify-self-start">
      <TypedField
        path={[...path, 'aluminiumArea']}
        label="Nominal aluminium area"
        units={AREA_UNITS}
        optional
        hint="not filed; it proposes the d.c. resistance at 20 °C by the resistivity of IEC 60889, without the lay of the strands"
      />
      {proposed && (
        <Button small onClick={() => set([...path, 'dcResistance20OhmPerKm'], proposed)}>
          {`Put in ${proposed.text}\u2009Ω/km`}
        </Button>
      )}
    </div>
  );
}

/** A conductor's own data: what the chosen model needs first, the rest optional. */
export function OwnConductor({ path, model }: { path: FormPath; model: 'handbook' | 'tube' }) {
  const tube = model === 'tube';
  return (
    <div className="border-l-2 border-rule pl-4">
      <FieldGrid>
        <TextField path={[...path, 'name']} label="Its name" optional />
        <ChoiceField path={[...path, 'model']} label="Computed from" options={MODELS} />
        <TypedField path={[...path, 'diameterMm']} label="Diameter" units={DIAMETER_UNITS} />
        <TypedField
          path={[...path, 'coreDiameterMm']}
          label="Core diameter"
          units={DIAMETER_UNITS}
          optional
          hint="the core that carries no current; 0 for a solid wire"
        />
        <TypedField path={[...path, 'gmrMm']} label="GMR" units={GMR_UNITS} optional={tube} />
        <TypedField
          path={[...path, 'acResistanceOhmPerKm']}
          label="A.C. resistance"
          units={WIRE_RESISTANCE_UNITS}
          optional={tube}
        />
        {tube && <AluminiumArea path={path} />}
        <TypedField
          path={[...path, 'dcResistance20OhmPerKm']}
          label="D.C. resistance at 20 °C"
          units={WIRE_RESISTANCE_UNITS}
          optional={!tube}
        />
        <TypedField path={[...path, 'temperatureC']} label="Temperature" units="°C" optional={!tube} />
        <TypedField
          path={[...path, 'temperatureCoefficientPerK']}
          label="Temperature coefficient"
          units="1/K"
          optional
          hint="0.00403 if left empty"
        />
      </FieldGrid>
    </div>
  );
}
