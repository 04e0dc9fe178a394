import type { Attachment } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { fileSize } from '../../../lib/file-size';

/** Files with their size, who sent them and when; each opens as it was sent. */
export function FileList({ files }: { files: readonly Attachment[] }) {
  return (
    <ul>
      {files.map((file) => (
        <li
          key={file.id}
          className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 border-t border-rule py-2 text-table first:border-t-0"
        >
          <a
            className="link truncate"
            href={file.href}
            download={file.fileName}
            title={`SHA-256 ${file.sha256}`}
          >
            {file.fileName}
          </a>
          <span className="text-ink-soft">{fileSize(file.byteLength)}</span>
          <span className="col-span-2 text-label text-ink-soft">
            {`${file.uploadedBy.name}, ${formatDate(file.uploadedAt)}${subjectWords(file)}`}
          </span>
        </li>
      ))}
    </ul>
  );
}

function subjectWords({ subject }: Attachment): string {
  if (subject.discrepancy !== null) return `, with D-${subject.discrepancy}`;
  return subject.lineKey === null ? '' : `, with ${subject.lineKey}`;
}
