import { useState } from 'react';
import type { Import } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Progress } from '../../../components/feedback/progress';
import { Sheet } from '../../../components/ui/sheet';
import { addressOf } from '../../../lib/api/call';
import { fileSize } from '../../../lib/file-size';
import { useImportFile } from '../api/import-file';
import { exportBlockedBy } from '../model/dialect-words';
import type { Correction } from '../model/dialect-words';
import { FileDrop } from './file-drop';
import { ImportResult } from './import-result';

interface ImportPanelProps {
  number: string;
  /** Whether the draft holds lines that can be sent out again. */
  hasLines: boolean;
  /** Keys of the lines that are not complete: while there are any, the draft cannot be sent out. */
  incomplete: readonly string[];
}

function Exports({ number, incomplete }: Pick<ImportPanelProps, 'number' | 'incomplete'>) {
  const reason = exportBlockedBy(incomplete);
  if (reason) return <p className="text-ink-soft">{reason}</p>;
  const href = (format: 'json' | 'csv') =>
    addressOf('exportLines', { params: { applicationId: number }, query: { format } });
  return (
    <p className="flex flex-wrap gap-x-4 gap-y-1 text-ink-soft">
      <span>The draft as a file:</span>
      <a className="link" href={href('json')} download>
        JSON
      </a>
      <a className="link" href={href('csv')} download>
        CSV
      </a>
    </p>
  );
}

function Sending({ file, share }: { file: File; share: number }) {
  return (
    <div className="w-full">
      <Progress
        label={`Sending ${file.name}`}
        done={Math.round(share * file.size)}
        total={file.size}
        format={fileSize}
      />
      {share >= 1 && <p className="mt-1 text-ink-soft">The file has arrived and is being read.</p>}
    </div>
  );
}

/** Takes lines from a JSON or CSV file into the draft: sent, read, shown, and only then taken. */
export function ImportPanel({ number, hasLines, incomplete }: ImportPanelProps) {
  const [file, setFile] = useState<File | null>(null);
  const [share, setShare] = useState(0);
  const [last, setLast] = useState<Import | null>(null);
  const reading = useImportFile(number, setShare);
  // While a file is read again, what was read of it before stays on the page.
  const shown = reading.data ?? (reading.isPending ? last : null);

  const read = (chosen: File, correction?: Correction) => {
    setFile(chosen);
    setLast(correction ? shown : null);
    setShare(0);
    reading.mutate({ file: chosen, correction });
  };
  const putAside = () => {
    setFile(null);
    setLast(null);
    reading.reset();
  };
  return (
    <Sheet title="Import" aside={file && <span className="font-mono text-label">{file.name}</span>}>
      <div className="sheet-body grid gap-4 text-table">
        {shown ? (
          <ImportResult
            number={number}
            read={shown}
            rereading={reading.isPending}
            onReread={(correction) => file && read(file, correction)}
            onDone={putAside}
          />
        ) : (
          <FileDrop busy={reading.isPending} onFile={(chosen) => read(chosen)}>
            {reading.isPending && file && <Sending file={file} share={share} />}
          </FileDrop>
        )}
        <ProblemNotice error={reading.error} />
        {hasLines && <Exports number={number} incomplete={incomplete} />}
      </div>
    </Sheet>
  );
}
