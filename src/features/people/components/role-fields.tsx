import type { Organisation } from '#shared/contracts/api.generated';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import type { Role } from '../../../lib/api/session';
import { ROLE_WORDS, rolesIn } from '../model/roles';

export interface RoleChoice {
  organisationId: string;
  role: Role | '';
}

interface RoleFieldsProps {
  organisations: readonly Organisation[];
  value: RoleChoice;
  onChange: (value: RoleChoice) => void;
  /** Shown once somebody has tried without choosing. */
  tried: boolean;
}

/** An organisation and a role that goes with it. */
export function RoleFields({ organisations, value, onChange, tried }: RoleFieldsProps) {
  const chosen = organisations.find((o) => o.id === value.organisationId);
  const roles = rolesIn(chosen);
  return (
    <div className="grid gap-4 field:grid-cols-2">
      <Field label="Organisation" error={tried && !chosen ? 'Choose an organisation.' : null}>
        {(ties) => (
          <Select
            {...ties}
            value={value.organisationId}
            none="Choose"
            options={organisations.map((o) => ({ value: o.id, label: o.name }))}
            onChange={(event) => {
              const next = organisations.find((o) => o.id === event.target.value);
              onChange({ organisationId: event.target.value, role: rolesIn(next)[0] ?? '' });
            }}
          />
        )}
      </Field>
      <Field label="Role" error={tried && chosen && value.role === '' ? 'Choose a role.' : null}>
        {(ties) => (
          <Select
            {...ties}
            value={value.role}
            disabled={roles.length === 0}
            options={roles.map((role) => ({ value: role, label: ROLE_WORDS[role] }))}
            onChange={(event) => onChange({ ...value, role: event.target.value as Role })}
          />
        )}
      </Field>
    </div>
  );
}
