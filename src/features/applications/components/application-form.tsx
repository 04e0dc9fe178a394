import type { FormEvent } from 'react';
import { ErrorSummary } from '../../../components/feedback/error-summary';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button, ButtonLink } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { FormText } from '../../../components/ui/form-text';
import { Select } from '../../../components/ui/inputs';
import { NumberField } from '../../../components/ui/number-field';
import { Sheet } from '../../../components/ui/sheet';
import { useTexts } from '../../../hooks/use-texts';
import { ApiProblem } from '../../../lib/api/problem';
import { faultsByField } from '../../../lib/field-faults';
import { applicationBody, applicationWishes, formFaults } from '../model/application-texts';
import type { ApplicationField, ApplicationTexts } from '../model/application-texts';
import { CONNECTION_KINDS } from '../model/words';

interface ApplicationFormProps {
  initial: ApplicationTexts;
  /** What the button says. */
  confirm: string;
  backTo: string;
  busy: boolean;
  error: Error | null;
  onSend: (body: ReturnType<typeof applicationBody>) => void;
}

const idOf = (name: ApplicationField): string => `application-${name}`;

const FIELDS: readonly ApplicationField[] = [
  'title',
  'connectionKind',
  'capacityMw',
  'pointOfConnection',
  'contactName',
  'contactEmail',
  'contactPhone',
];

/** Faults of fields are said at the fields; anything else that the server refused is said above them. */
const isAboutFields = (error: Error | null): boolean =>
  error instanceof ApiProblem && error.faults.some((f) => f.pointer);

/** The head of an application: what is to be connected, where, how large, whom to ask. */
export function ApplicationForm({ initial, confirm, backTo, busy, error, onSend }: ApplicationFormProps) {
  const form = useTexts<ApplicationField>(
    { ...initial },
    applicationWishes,
    formFaults(faultsByField(error)),
  );
  const field = (name: ApplicationField) => ({ id: idOf(name), ...form.field(name) });
  const items = FIELDS.flatMap((name) => {
    const message = form.errorOf(name);
    return message ? [{ fieldId: idOf(name), message }] : [];
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit((texts) => onSend(applicationBody(texts)));
  };
  const { error: kindError, value: kind, onText: setKind } = form.field('connectionKind');
  const { onText: setCapacity, ...capacity } = field('capacityMw');
  return (
    <form onSubmit={submit} noValidate className="max-w-[720px]">
      <ErrorSummary title="Some fields need another look" items={items} />
      <Sheet main label="The application">
        <div className="grid gap-x-6 gap-y-4 p-4 field:grid-cols-2 field:p-6">
          <div className="field:col-span-2">
            <FormText label="Title" hint="as your organisation calls the connection" {...field('title')} />
          </div>
          <Field label="Kind of connection" id={idOf('connectionKind')} error={kindError}>
            {(ties) => (
              <Select
                {...ties}
                none="choose one"
                options={CONNECTION_KINDS}
                value={kind}
                onChange={(event) => setKind(event.target.value)}
              />
            )}
          </Field>
          <NumberField
            {...capacity}
            label="Capacity"
            unit="MW"
            optional
            onChange={(event) => setCapacity(event.target.value)}
          />
          <div className="field:col-span-2">
            <FormText
              label="Point of connection"
              hint="the substation or line to connect at"
              {...field('pointOfConnection')}
            />
          </div>
          <FormText label="Contact" autoComplete="name" {...field('contactName')} />
          <FormText label="Email" type="email" autoComplete="email" {...field('contactEmail')} />
          <FormText label="Telephone" type="tel" autoComplete="tel" optional {...field('contactPhone')} />
        </div>
        <div className="sheet-foot !justify-start">
          <Button type="submit" kind="primary" busy={busy}>
            {confirm}
          </Button>
          <ButtonLink to={backTo}>Cancel</ButtonLink>
        </div>
      </Sheet>
      {!isAboutFields(error) && <ProblemNotice error={error} className="mt-6" />}
    </form>
  );
}
