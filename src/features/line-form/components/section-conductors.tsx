import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import { useLineFormView } from '../hooks/form-context';
import { useFieldTies } from '../hooks/use-field';
import { changeSection, groundWiresOf, phasesOf, setBundle } from '../model/edit';
import type { SectionForm } from '../model/form-types';
import { pointerOf } from '../model/pointers';
import { SPACING_UNITS } from '../model/unit-choices';
import { ConductorFields } from './conductor-fields';
import { FieldGrid, FormPart } from './form-part';
import { PutHere } from './put-notice';
import { SharedBundleSpacing } from './shared-bundle-spacing';
import { ChoiceField } from './text-fields';
import { TypedField } from './typed-field';

interface SectionPartProps {
  index: number;
  section: SectionForm;
}

const BONDINGS = [
  { value: 'continuous', label: 'grounded throughout' },
  { value: 'segmented', label: 'segmented, carrying no current' },
];

function labelOf(name: string): string {
  if (name === 'phase') return 'Phase conductor';
  if (name === 'ground') return 'Ground wire';
  return `Conductor “${name}”`;
}

/** How many subconductors each phase has; one number for the section unless its phases differ. */
function Bundle({ index, section }: SectionPartProps) {
  const { change } = useLineFormView();
  const counts = [...new Set(phasesOf(section).map((p) => p.bundleCount))];
  const count = counts.length === 1 ? (counts[0] ?? '1') : '';
  const first = section.positions.findIndex((p) => p.kind === 'phase');
  const ties = useFieldTies(['sections', index, 'positions', first, 'bundleCount']);
  const pointer = pointerOf(['sections', index, 'positions', first, 'bundleCount']);
  return (
    <>
      <div className="min-w-0">
        <Field
          id={ties.id}
          error={ties.error}
          label="Subconductors per phase"
          hint={counts.length > 1 ? 'the phases differ; a choice here sets them all' : undefined}
        >
          {(control) => (
            <Select
              {...control}
              onFocus={ties.onFocus}
              onBlur={ties.onBlur}
              value={count}
              onChange={(event) =>
                change((f) =>
                  changeSection(f, index, (s) => setBundle(s, { bundleCount: event.target.value })),
                )
              }
              none={counts.length > 1 ? 'differ' : undefined}
              options={Array.from({ length: 8 }, (_, i) => ({ value: String(i + 1), label: String(i + 1) }))}
            />
          )}
        </Field>
        <PutHere pointer={pointer} />
      </div>
      {count === '1' ? (
        <span className="hidden field:block" />
      ) : (
        <SharedBundleSpacing index={index} units={SPACING_UNITS} />
      )}
    </>
  );
}

/** The conductors of a section, its bundle, its ground wires' bonding, the earth below. */
export function SectionConductors({ index, section }: SectionPartProps) {
  const { ownersResistivityOhmM } = useLineFormView();
  const used = new Set(section.positions.map((p) => p.conductor));
  const names = Object.keys(section.conductors).filter((name) => used.has(name));
  const path = ['sections', index] as const;
  const withGround = groundWiresOf(section).length > 0;
  return (
    <FormPart title="Conductors and earth" note="From the shared list, or your own data sheet.">
      <div className="grid gap-5">
        {section.hasGeometry &&
          names.map((name) => {
            const conductor = section.conductors[name];
            return (
              conductor && (
                <ConductorFields
                  key={name}
                  section={index}
                  name={name}
                  conductor={conductor}
                  label={labelOf(name)}
                />
              )
            );
          })}
        <FieldGrid>
          {section.hasGeometry && <Bundle index={index} section={section} />}
          {withGround && section.hasGeometry && (
            <ChoiceField path={[...path, 'groundWireBonding']} label="Ground wires are" options={BONDINGS} />
          )}
          <TypedField
            path={[...path, 'earthResistivityOhmM']}
            label="Earth resistivity"
            units="Ω m"
            hint={`${ownersResistivityOhmM} is our assumption if you leave it empty`}
          />
        </FieldGrid>
      </div>
    </FormPart>
  );
}
