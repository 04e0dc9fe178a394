import type { Conductor } from '#shared/contracts/api.generated';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import { useLineFormView } from '../hooks/form-context';
import { useFieldTies } from '../hooks/use-field';
import {
  chooseFromLibrary,
  conductorWords,
  familyOf,
  isForGroundWires,
  ownData,
} from '../model/conductor-choice';
import type { ConductorForm } from '../model/form-types';
import { OwnConductor } from './own-conductor';
import { TypedField } from './typed-field';

const OWN = '\u0000own';

/** The library's conductors by family; those that lack what the model needs stand there but cannot be chosen. */
function LibraryOptions({ conductors, current }: { conductors: readonly Conductor[]; current: string }) {
  const shown = conductors.filter((c) => !c.retired || c.name === current);
  const families = [...new Set(shown.map(familyOf))];
  const unknown = current !== '' && !shown.some((c) => c.name === current);
  return (
    <>
      {unknown && <option value={current}>{`${current} (not in the list)`}</option>}
      {families.map((family) => (
        <optgroup key={family} label={family}>
          {shown
            .filter((c) => familyOf(c) === family)
            .map((c) => (
              <option key={c.name} value={c.name} disabled={!c.choosable}>
                {!c.choosable ? `${c.name} (data missing)` : c.name}
              </option>
            ))}
        </optgroup>
      ))}
    </>
  );
}

interface ConductorFieldsProps {
  section: number;
  name: string;
  conductor: ConductorForm;
  label: string;
}

/** A conductor from the shared list at a temperature, or the data of the applicant's own sheet. */
export function ConductorFields({ section, name, conductor, label }: ConductorFieldsProps) {
  const { conductors, set } = useLineFormView();
  const path = ['sections', section, 'conductors', name] as const;
  const { error, hint: _, ...ties } = useFieldTies([...path, 'library']);
  const chosen = conductors.find((c) => c.name === conductor.library);
  const grounds = name.startsWith('ground');
  const offered = [...conductors].sort(
    (a, b) =>
      Number(isForGroundWires(familyOf(b)) === grounds) - Number(isForGroundWires(familyOf(a)) === grounds),
  );
  const choose = (value: string) =>
    set(path, value === OWN ? ownData(conductor, chosen) : chooseFromLibrary(conductor, conductors, value));
  return (
    <div className="grid gap-3">
      <div className="grid gap-x-6 gap-y-4 field:grid-cols-2">
        <Field label={label} id={ties.id} error={error} hint={conductorWords(conductor, chosen)}>
          {(control) => (
            <Select
              {...control}
              onFocus={ties.onFocus}
              onBlur={ties.onBlur}
              value={conductor.source === 'own' ? OWN : conductor.library}
              onChange={(event) => choose(event.target.value)}
            >
              <option value="">choose one</option>
              <option value={OWN}>Own data sheet</option>
              <LibraryOptions conductors={offered} current={conductor.library} />
            </Select>
          )}
        </Field>
        {conductor.source === 'library' && (
          <TypedField path={[...path, 'temperatureC']} label="At a temperature of" units="°C" />
        )}
      </div>
      {conductor.source === 'own' && <OwnConductor path={path} model={conductor.model} />}
    </div>
  );
}
