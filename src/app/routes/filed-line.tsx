import type { QueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Notice } from '../../components/feedback/notice';
import { PageHead } from '../../components/ui/page-head';
import { CasePrintFrame } from '../../features/applications/components/case-print-frame';
import { LineSheet } from '../../features/line-sheet/components/line-sheet';
import { applicationQuery, useApplication } from '../../lib/queries/get-application';
import { revisionLineQuery, useRevisionLine } from '../../lib/queries/get-revision-line';

type Params = Readonly<Record<string, string | undefined>>;

export const prefetch = (client: QueryClient, { number = '', letter = '', lineKey = '' }: Params) =>
  Promise.all([
    client.prefetchQuery(applicationQuery(number)),
    client.prefetchQuery(revisionLineQuery(number, letter, lineKey)),
  ]);

/** A line as it was filed, with what the check found. */
export function Component() {
  const { number = '', letter = '', lineKey = '' } = useParams();
  const application = useApplication(number);
  const line = useRevisionLine(number, letter, lineKey);
  return (
    <>
      <CasePrintFrame number={number} subject="Check report" letter={letter} />
      <PageHead
        title={line.name}
        crumbs={[
          { label: number, to: `/applications/${number}` },
          { label: `revision ${letter}` },
          { label: lineKey },
        ]}
        lead={`As filed in revision ${letter}, with what the check found.`}
      />
      <LineSheet applicationNumber={number} letter={letter} lineKey={lineKey} />
      <Notice className="mt-6">{application.caution}</Notice>
    </>
  );
}
