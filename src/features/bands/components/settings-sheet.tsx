import type { BandDraft } from '#shared/contracts/api.generated';
import { NumberField } from '../../../components/ui/number-field';
import { Sheet } from '../../../components/ui/sheet';
import type { DraftEdits } from '../hooks/use-draft-edits';
import { settingFaults, settingGroups, settingText, type SettingField } from '../model/settings-form';

interface SettingsSheetsProps {
  draft: BandDraft;
  edits: DraftEdits;
  /** Values in force, by place, where they are known. */
  inForce: ReadonlyMap<string, number>;
}

/** Tolerances, uncertainties, assumptions and windows, each figure a field. */
export function SettingsSheets({ draft, edits, inForce }: SettingsSheetsProps) {
  const groups = settingGroups(draft);
  const faults = settingFaults(groups, edits.settings);
  return groups.map((group) => (
    <Sheet key={group.title} title={group.title} aside={group.aside}>
      <div className="sheet-body grid gap-4 field:grid-cols-2 table:grid-cols-4">
        {group.fields.map((field) => (
          <Setting
            key={field.place}
            field={field}
            text={edits.settings[field.place] ?? settingText(field)}
            now={inForce.get(field.place)}
            fault={faults[field.place]}
            onChange={(text) => edits.editSetting(field.place, text)}
          />
        ))}
      </div>
    </Sheet>
  ));
}

interface SettingProps {
  field: SettingField;
  text: string;
  now: number | undefined;
  fault: string | undefined;
  onChange: (text: string) => void;
}

function Setting({ field, text, now, fault, onChange }: SettingProps) {
  const nowText = now === undefined ? null : settingText({ value: now, scale: field.scale });
  const changed = nowText !== null && nowText !== text.trim();
  return (
    <NumberField
      label={field.label}
      unit={field.unit}
      value={text}
      changed={changed}
      error={fault}
      hint={changed ? `now ${nowText}` : undefined}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}
