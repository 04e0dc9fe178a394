import type { Attachment } from '#shared/contracts/api.generated';
import { Sheet } from '../../../components/ui/sheet';
import { AttachButton } from './attach-button';
import { FileList } from './file-list';

interface AttachmentsSheetProps {
  number: string;
  files: readonly Attachment[];
  /** Whether files may still be added. */
  open: boolean;
}

/** The files kept with a case. */
export function AttachmentsSheet({ number, files, open }: AttachmentsSheetProps) {
  if (!open && files.length === 0) return null;
  return (
    <Sheet title="Files" aside={files.length === 0 ? 'none' : String(files.length)}>
      <div className="sheet-body">
        {files.length === 0 && (
          <p className="mb-3 text-control text-ink-soft">
            {'Data sheets, single-line diagrams, tables: PDF, PNG or JPEG up to 20\u2009MB.'}
          </p>
        )}
        <FileList files={files} />
        {open && (
          <div className="mt-3">
            <AttachButton number={number} />
          </div>
        )}
      </div>
    </Sheet>
  );
}
