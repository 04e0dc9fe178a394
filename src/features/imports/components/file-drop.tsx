import { useRef, useState } from 'react';
import type { DragEvent, ReactNode } from 'react';
import { Button } from '../../../components/ui/button';
import { classNames } from '../../../components/ui/class-names';

interface FileDropProps {
  busy: boolean;
  onFile: (file: File) => void;
  /** What is under way, below the button. */
  children?: ReactNode;
}

/** Where a file of lines is chosen, or dropped. */
export function FileDrop({ busy, onFile, children }: FileDropProps) {
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const take = (file: File | undefined) => file && onFile(file);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files[0]);
  };
  return (
    <div
      className={classNames(
        'grid justify-items-start gap-3 border border-dashed p-4',
        over ? 'border-copper bg-copper-wash' : 'border-rule-strong',
      )}
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
    >
      <p className="text-ink-soft">
        Lines from a filing in JSON, or from a table in CSV with one row a section. You see what was read
        before anything enters the draft.
      </p>
      <input
        ref={input}
        type="file"
        className="sr-only"
        tabIndex={-1}
        aria-label="File to import"
        accept=".json,.csv,.txt,application/json,text/csv"
        onChange={(event) => {
          take(event.target.files?.[0]);
          // The same file may be chosen again once it is mended.
          event.target.value = '';
        }}
      />
      <Button small busy={busy} onClick={() => input.current?.click()}>
        Choose a file
      </Button>
      {children}
    </div>
  );
}
