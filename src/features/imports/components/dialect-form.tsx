import { useState } from 'react';
import type { Import } from '#shared/contracts/api.generated';
import { Button } from '../../../components/ui/button';
import { Disclosure } from '../../../components/ui/disclosure';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import { CHOICES, dialectWords } from '../model/dialect-words';
import type { Correction } from '../model/dialect-words';

interface DialectFormProps {
  dialect: NonNullable<Import['dialect']>;
  busy: boolean;
  onReread: (correction: Correction) => void;
}

/** How a table is written, as it was found; where that is wrong, the applicant says how and it is read again. */
export function DialectForm({ dialect, busy, onReread }: DialectFormProps) {
  const { delimiter, decimal, encoding } = dialect;
  const [correction, setCorrection] = useState<Correction>({ delimiter, decimal, encoding });
  return (
    <div>
      <p className="text-ink-soft">{`${dialectWords(dialect)}.`}</p>
      <Disclosure summary="It is written otherwise" className="mt-1">
        <div className="mt-2 grid gap-3">
          {CHOICES.map(({ name, label, options }) => (
            <Field key={name} label={label}>
              {(ties) => (
                <Select
                  {...ties}
                  small
                  options={options}
                  value={correction[name]}
                  onChange={(event) =>
                    setCorrection((before) => ({ ...before, [name]: event.target.value }) as Correction)
                  }
                />
              )}
            </Field>
          ))}
          <div>
            <Button small busy={busy} onClick={() => onReread(correction)}>
              Read it again
            </Button>
          </div>
        </div>
      </Disclosure>
    </div>
  );
}
