import { useState } from 'react';
import type { Import } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useCaseWrite } from '../../../lib/queries/use-case-write';
import { readWords } from '../model/dialect-words';
import type { Correction } from '../model/dialect-words';
import { DialectForm } from './dialect-form';
import { FaultTable } from './fault-table';
import { FirstFaults } from './first-faults';
import { ReadLines } from './read-lines';

interface ImportResultProps {
  number: string;
  read: Import;
  rereading: boolean;
  onReread: (correction: Correction) => void;
  /** Puts the file aside: another may be chosen. */
  onDone: () => void;
}

/** What was read of a file: how it is written, what can be taken, what must be looked at; then the applicant's word. */
export function ImportResult({ number, read, rereading, onReread, onDone }: ImportResultProps) {
  const [looking, setLooking] = useState(false);
  const take = useCaseWrite('takeImport', number);
  const { id, lines, faults, notices, dialect } = read;
  // What concerns the whole file stands in the words on its dialect.
  const aboutPlaces = notices.filter((n) => n.pointer !== undefined || n.row !== undefined);
  const takeLines = (which: 'all' | 'good') =>
    take.mutate({ params: { importId: id }, body: { take: which } }, { onSuccess: onDone });
  return (
    <div className="grid gap-3 text-table" role="status">
      <p className="text-h3 font-strong">{readWords(read)}</p>
      {dialect && <DialectForm key={id} dialect={dialect} busy={rereading} onReread={onReread} />}
      {lines.length > 0 && <ReadLines lines={lines} />}
      {[...new Set(aboutPlaces.map((notice) => notice.message))].map((message) => (
        <p key={message} className="text-ink-soft">
          {message}
        </p>
      ))}
      {faults.length > 0 && (
        <div className="grid gap-2">
          {lines.length === 0 && <FirstFaults faults={faults} />}
          <div>
            <Button small onClick={() => setLooking(true)}>
              {faults.length === 1 ? 'The place to look at' : `All ${faults.length} places`}
            </Button>
          </div>
        </div>
      )}
      <ProblemNotice error={take.error} />
      <div className="flex flex-wrap gap-3">
        {lines.length > 0 && (
          <Button
            small
            kind="primary"
            busy={take.isPending}
            onClick={() => takeLines(faults.length === 0 ? 'all' : 'good')}
          >
            {lines.length === 1 ? 'Take the line' : `Take ${lines.length} lines`}
          </Button>
        )}
        <Button small onClick={onDone}>
          {lines.length > 0 ? 'Take nothing' : 'Choose another file'}
        </Button>
      </div>
      <Dialog
        open={looking}
        onOpenChange={setLooking}
        title={read.fileName}
        description={readWords(read)}
        wide
      >
        <FaultTable faults={faults} />
      </Dialog>
    </div>
  );
}
