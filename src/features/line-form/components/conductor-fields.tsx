import type { Conductor } from '#shared/contracts/api.generated';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import { useLineFormView } from '../hooks/form-context';
import { useFieldTies } from '../hooks/use-field';
import { chooseFromLibrary, conductorWords, ownData } from '../model/conductor-choice';
import { offeredFor } from '../model/conductor-groups';
import type { ConductorUse } from '../model/conductor-groups';
import type { ConductorForm } from '../model/form-types';
import { OwnConductor } from './own-conductor';
import { TypedField } from './typed-field';

const OWN = '\u0000own';

interface LibraryOptionsProps {
  conductors: readonly Conductor[];
  current: string;
  use: ConductorUse;
}

/** The library's conductors, those of the use first; what lacks data stands at the end, closed. */
function LibraryOptions({ conductors, current, use }: LibraryOptionsProps) {
  const unknown = current !== '' && !conductors.some((c) => c.name === current);
  return (
    <>
      {unknown && <option value={current}>{`${current} (not in the list)`}</option>}
      {offeredFor(use, conductors, current).map(({ label, closed, items }) => (
        <optgroup key={label} label={label} disabled={closed}>
          {items.map((c) => (
            <option key={c.name} value={c.name}>
              {c.name}
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
              <LibraryOptions
                conductors={conductors}
                current={conductor.library}
                use={name.startsWith('ground') ? 'ground' : 'phase'}
              />
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
