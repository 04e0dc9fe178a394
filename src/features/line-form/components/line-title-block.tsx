import type { Application } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Stamp } from '../../../components/ui/stamp';
import { TitleBlock } from '../../../components/ui/title-block';
import { plainQuantity } from '../../../lib/plain-number';
import type { LineForm } from '../model/form-types';
import { readNumber } from '../model/number-text';

interface LineTitleBlockProps {
  application: Application;
  lineKey: string;
  /** Lines of the draft, this one among them. */
  count: number;
  form: LineForm;
}

/** The title block of a line's form: whose it is, which revision it goes into, where it stands. */
export function LineTitleBlock({ application, lineKey, count, form }: LineTitleBlockProps) {
  const voltage = readNumber(form.nominalVoltageKv.text);
  const { capacityMw, pointOfConnection } = application;
  const place =
    capacityMw === null
      ? `at ${pointOfConnection}`
      : `${plainQuantity(capacityMw, 'MW')} at ${pointOfConnection}`;
  const connection = application.title.includes(`at ${pointOfConnection}`) ? undefined : place;
  return (
    <TitleBlock
      label="Title block"
      cells={[
        {
          label: 'Application',
          value: application.title,
          aside: connection,
          span: 8,
          lead: true,
          fold: 'name',
        },
        { label: 'Number', value: application.number, span: 2, lead: true, fold: 'number' },
        {
          label: 'Revision',
          value: <RevisionTriangle letter={application.nextRevision} />,
          span: 2,
          fold: 'revision',
        },
        { label: 'Line', value: `${lineKey}, one of ${count}`, span: 3 },
        {
          label: 'Voltage',
          value: voltage.kind === 'number' ? plainQuantity(voltage.value, 'kV') : 'not given',
          span: 3,
        },
        { label: 'State', value: <Stamp state={application.state} />, span: 3, fold: 'state' },
        {
          label: 'To file by',
          value: application.dueAt ? formatDate(application.dueAt) : 'no date',
          span: 3,
          fold: 'due',
        },
      ]}
    />
  );
}
