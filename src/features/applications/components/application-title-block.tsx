import type { Application } from '#shared/contracts/api.generated';
import { formatDate, leftInWords } from '#shared/format/dates';
import { WindowMeter } from '../../../components/charts/window-meter';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Stamp } from '../../../components/ui/stamp';
import { TitleBlock } from '../../../components/ui/title-block';
import type { TitleBlockCell } from '../../../components/ui/title-block';
import { besideTitle, dueWords, linesWords, voltagesWords } from '../model/words';

function filedCell({ filedAt, filedBy }: Application): TitleBlockCell {
  if (!filedAt) return { label: 'Filed', value: 'not yet', span: 4 };
  return {
    label: 'Filed',
    value: formatDate(filedAt),
    aside: filedBy ? `by ${filedBy.name}` : undefined,
    span: 4,
  };
}

function dueCell(application: Application): TitleBlockCell {
  const { window, dueAt } = application;
  const label = dueWords(application);
  if (!window || !dueAt) return { label, value: 'no date', span: 9, fold: 'due' };
  return {
    label,
    value: formatDate(dueAt),
    aside: leftInWords(window.left),
    meter: <WindowMeter used={window.used} total={window.total} perDay={8} />,
    span: 9,
    fold: 'due',
  };
}

/** The title block of an application. */
export function ApplicationTitleBlock({ application }: { application: Application }) {
  const { title, number, revision, nextRevision, reviewer, state } = application;
  return (
    <TitleBlock
      label="Title block"
      cells={[
        {
          label: 'Application',
          value: title,
          aside: besideTitle(application),
          span: 8,
          lead: true,
          fold: 'name',
        },
        { label: 'Number', value: number, span: 2, lead: true, fold: 'number' },
        {
          label: 'Revision',
          value: <RevisionTriangle letter={revision ?? nextRevision} older={revision === null} />,
          span: 2,
          fold: 'revision',
        },
        { label: 'Voltages', value: voltagesWords(application.voltagesKv), span: 3 },
        { label: 'Lines', value: linesWords(application.lineCount, application.totalLengthKm), span: 3 },
        filedCell(application),
        { label: 'Reviewer', value: reviewer?.name ?? 'nobody yet', span: 2 },
        { label: 'State', value: <Stamp state={state} />, span: 3, fold: 'state' },
        dueCell(application),
      ]}
    />
  );
}
