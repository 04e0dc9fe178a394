import { useState, type FormEvent } from 'react';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { TextInput } from '../../../components/ui/inputs';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useCreateOrganisation } from '../api/create-organisation';
import { useOrganisations } from '../api/list-organisations';

/** The organisations that people belong to, and the way to add an applicant's. */
export function OrganisationsSheet() {
  const organisations = useOrganisations();
  const create = useCreateOrganisation();
  const [name, setName] = useState('');
  const [missing, setMissing] = useState(false);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setMissing(name.trim() === '');
    if (name.trim() !== '') create.mutate({ name: name.trim() }, { onSuccess: () => setName('') });
  };
  return (
    <Sheet title="Organisations" aside={organisations.length}>
      <Table label="Organisations" folds>
        <TableHead>
          <Row>
            <HeadCell>Name</HeadCell>
            <HeadCell>Kind</HeadCell>
            <HeadCell number>People</HeadCell>
            <HeadCell number>Applications</HeadCell>
          </Row>
        </TableHead>
        <TableBody>
          {organisations.map((organisation) => (
            <Row key={organisation.id}>
              <RowHead>{organisation.name}</RowHead>
              <Cell fold="end">{organisation.kind === 'owner' ? 'grid owner' : 'applicant'}</Cell>
              <Cell number foldLabel="People">
                {organisation.members}
              </Cell>
              <Cell number foldLabel="Applications">
                {organisation.applications}
              </Cell>
            </Row>
          ))}
        </TableBody>
      </Table>
      <form onSubmit={submit} className="sheet-foot !items-end" noValidate>
        <Field
          label="Another applicant organisation"
          error={missing ? 'Write its name.' : null}
          className="min-w-0 flex-1"
        >
          {(ties) => (
            <TextInput {...ties} maxLength={120} value={name} onChange={(e) => setName(e.target.value)} />
          )}
        </Field>
        <Button type="submit" busy={create.isPending}>
          Add
        </Button>
        <ProblemNotice error={create.error} className="basis-full" />
      </form>
    </Sheet>
  );
}
