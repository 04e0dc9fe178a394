import { NumberField } from '../../../components/ui/number-field';
import { useLineFormView } from '../hooks/form-context';
import { useTypedField } from '../hooks/use-field';
import { changeSection, setBundle } from '../model/edit';
import type { Typed } from '../model/form-types';
import { pointerOf } from '../model/pointers';
import type { UnitChoice } from '../model/unit-choices';
import { PutHere } from './put-notice';

/** The spacing of the bundle, written to every phase of the section. */
export function SharedBundleSpacing({ index, units }: { index: number; units: readonly UnitChoice[] }) {
  const { form, change } = useLineFormView();
  const first = (form.sections[index]?.positions ?? []).findIndex((p) => p.kind === 'phase');
  const path = ['sections', index, 'positions', first, 'bundleSpacingM'] as const;
  const { ties, text, unit } = useTypedField(path);
  const write = (bundleSpacingM: Typed) =>
    change((f) => changeSection(f, index, (s) => setBundle(s, { bundleSpacingM })));
  return (
    <div className="min-w-0">
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
      <PutHere pointer={pointerOf(path)} />
    </div>
  );
}
