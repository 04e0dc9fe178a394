import { NumberField } from '../../../components/ui/number-field';
import { useLineFormView } from '../hooks/form-context';
import { useTypedField } from '../hooks/use-field';
import { changeSection, setBundle } from '../model/edit';
import type { Typed } from '../model/form-types';
import type { UnitChoice } from '../model/unit-choices';

/** The spacing of the bundle, written to every phase of the section. */
export function SharedBundleSpacing({ index, units }: { index: number; units: readonly UnitChoice[] }) {
  const { form, change } = useLineFormView();
  const first = (form.sections[index]?.positions ?? []).findIndex((p) => p.kind === 'phase');
  const { ties, text, unit } = useTypedField(['sections', index, 'positions', first, 'bundleSpacingM']);
  const write = (bundleSpacingM: Typed) =>
    change((f) => changeSection(f, index, (s) => setBundle(s, { bundleSpacingM })));
  return (
    <NumberField
      {...ties}
      label="Bundle spacing"
      value={text}
      onChange={(event) => write({ text: event.target.value, unit })}
      unit={{
        value: unit,
        onChange: (event) => write({ text, unit: event.target.value }),
        options: units.map((u) => ({ value: u.unit, label: u.label })),
      }}
    />
  );
}
