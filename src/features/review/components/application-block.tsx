import type { Application } from '#shared/contracts/api.generated';
import { formatDate, leftInWords } from '#shared/format/dates';
import { fixed, THIN_SPACE } from '#shared/format/numbers';
import { WindowMeter } from '../../../components/charts/window-meter';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Stamp } from '../../../components/ui/stamp';
import { TitleBlock, type TitleBlockCell } from '../../../components/ui/title-block';
import { connectionWords } from '../model/lead';

function dueCell({ window, dueAt }: Application): TitleBlockCell {
  if (!window || window.closedAt !== null || dueAt === null) {
    return { label: 'Due', value: 'nothing is due', span: 9, fold: 'due' };
  }
  return {
    label: window.kind === 'cure' ? 'Answers due' : 'Due',
    value: formatDate(dueAt),
    aside: (
      <span className={window.left < 0 ? 'font-semibold text-vermilion' : undefined}>
        {leftInWords(window.left)}
      </span>
    ),
    meter: <WindowMeter used={window.used} total={window.total} perDay={8} />,
    span: 9,
    fold: 'due',
  };
}

/** The title block of an application, as the owner's people read it. */
export function ApplicationBlock({ application }: { application: Application }) {
  const { applicant, number, revision, voltagesKv, lineCount, totalLengthKm, filedAt } = application;
  return (
    <TitleBlock
      label="Title block"
      cells={[
        {
          label: 'Application',
          value: application.title,
          aside: `${applicant.name}, ${connectionWords(application)}`,
          span: 8,
          lead: true,
          fold: 'name',
        },
        { label: 'Number', value: number, span: 2, lead: true, fold: 'number' },
        {
          label: 'Revision',
          value: revision ? <RevisionTriangle letter={revision} /> : 'none',
          span: 2,
          fold: 'revision',
        },
        { label: 'Voltages', value: voltagesKv.map((kv) => `${kv}${THIN_SPACE}kV`).join(', '), span: 3 },
        {
          label: 'Lines',
          value: `${lineCount}, together ${fixed(totalLengthKm, 1)}${THIN_SPACE}km`,
          span: 3,
        },
        {
          label: 'Filed',
          value: filedAt ? formatDate(filedAt) : 'not yet',
          aside: application.filedBy ? `by ${application.filedBy.name}` : undefined,
          span: 4,
        },
        { label: 'Reviewer', value: application.reviewer?.name ?? 'nobody yet', span: 2 },
        { label: 'State', value: <Stamp state={application.state} />, span: 3, fold: 'state' },
        dueCell(application),
      ]}
    />
  );
}
