import type { Letter } from '#shared/contracts/api.generated';
import { addressOf } from '../../../lib/api/call';
import { sizeWords } from '../model/letter-words';

/** The way to a letter as it was sent. The server lets files be saved only, never shown as a page of its own. */
export function LetterLinks({ letter }: { letter: Letter }) {
  const { applicationNumber, number, subject, byteLength } = letter;
  const href = addressOf('getLetter', { params: { applicationId: applicationNumber, number } });
  return (
    <span className="inline-flex flex-wrap items-center gap-3">
      <a
        className="link"
        href={href}
        download={`${applicationNumber}-letter-${number}.pdf`}
        aria-label={`Save as PDF: ${subject}`}
      >
        Save as PDF
      </a>
      <span className="text-label text-ink-soft">{sizeWords(byteLength)}</span>
    </span>
  );
}
