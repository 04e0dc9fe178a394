import { useRef, useState } from 'react';
import type { DragEvent } from 'react';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Progress } from '../../../components/feedback/progress';
import { Button } from '../../../components/ui/button';
import { Sheet } from '../../../components/ui/sheet';
import { addressOf } from '../../../lib/api/call';
import { fileSize } from '../../../lib/file-size';
import { useImportFile } from '../api/import-file';
import { ImportResult } from './import-result';

interface ImportPanelProps {
  number: string;
  /** Whether the draft holds lines that can be sent out again. */
  hasLines: boolean;
}

function Exports({ number }: { number: string }) {
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

/** Takes lines from a JSON or CSV file into the draft: sent, read, shown, and only then taken. */
export function ImportPanel({ number, hasLines }: ImportPanelProps) {
  const input = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<File | null>(null);
  const [share, setShare] = useState(0);
  const [over, setOver] = useState(false);
  const read = useImportFile(number, setShare);

  const choose = (chosen: File | undefined) => {
    if (!chosen) return;
    setFile(chosen);
    setShare(0);
    read.mutate(chosen);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    choose(event.dataTransfer.files[0]);
  };
  const done = () => {
    setFile(null);
    read.reset();
  };
  return (
    <Sheet title="Import" aside={file && <span className="font-mono text-label">{file.name}</span>}>
      <div className="sheet-body grid gap-4 text-table">
        {read.data ? (
          <ImportResult number={number} read={read.data} onDone={done} />
        ) : (
          <div
            className={`grid justify-items-start gap-3 border border-dashed p-4 ${over ? 'border-copper bg-copper-wash' : 'border-rule-strong'}`}
            onDragOver={(event) => {
              event.preventDefault();
              setOver(true);
            }}
            onDragLeave={() => setOver(false)}
            onDrop={drop}
          >
            <p className="text-ink-soft">
              Lines from a filing in JSON, or from a table in CSV with one row a section. You see what was
              read before anything enters the draft.
            </p>
            <input
              ref={input}
              type="file"
              className="sr-only"
              tabIndex={-1}
              aria-label="File to import"
              accept=".json,.csv,.txt,application/json,text/csv"
              onChange={(event) => {
                choose(event.target.files?.[0]);
                event.target.value = '';
              }}
            />
            <Button small busy={read.isPending} onClick={() => input.current?.click()}>
              Choose a file
            </Button>
            {read.isPending && file && (
              <div className="w-full">
                <Progress
                  label={`Sending ${file.name}`}
                  done={Math.round(share * file.size)}
                  total={file.size}
                  format={fileSize}
                />
                {share >= 1 && <p className="mt-1 text-ink-soft">The file has arrived and is being read.</p>}
              </div>
            )}
          </div>
        )}
        <ProblemNotice error={read.error} />
        {hasLines && <Exports number={number} />}
      </div>
    </Sheet>
  );
}
