import type { Letter } from '#shared/contracts/api.generated';
import { addressOf } from '../../../lib/api/call';
import { sizeWords } from '../model/letter-words';

/** The ways to a letter's PDF: read it in a tab of its own, or save it. */
export function LetterLinks({ letter }: { letter: Letter }) {
  const href = addressOf('getLetter', {
    params: { applicationId: letter.applicationNumber, number: letter.number },
  });
  const name = `${letter.applicationNumber}-letter-${letter.number}.pdf`;
  return (
    <span className="inline-flex flex-wrap items-center gap-3">
      <a className="link" href={href} target="_blank" rel="noreferrer" aria-label={`Read ${letter.subject}`}>
        Read
      </a>
      <a className="link" href={href} download={name} aria-label={`Save ${letter.subject} as PDF`}>
        Save
      </a>
      <span className="text-label text-ink-soft">{sizeWords(letter.byteLength)}</span>
    </span>
  );
}
