import type { Letter, RevisionSummary } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import { addressOf } from '../../../lib/api/call';

interface Entry {
  key: string;
  at: string;
  content: React.ReactNode;
  triangle: React.ReactNode;
}

/** The lines of a filed revision as a file, in both forms. */
function RevisionFiles({ number, letter }: { number: string; letter: string }) {
  const formats = ['json', 'csv'] as const;
  return (
    <span className="mt-0.5 flex gap-3 text-label">
      {formats.map((format) => (
        <a
          key={format}
          className="link"
          href={addressOf('exportLines', {
            params: { applicationId: number },
            query: { format, revision: letter },
          })}
          download
          aria-label={`Revision ${letter} as ${format.toUpperCase()}`}
        >
          {format.toUpperCase()}
        </a>
      ))}
    </span>
  );
}

function entries(number: string, letters: readonly Letter[], revisions: readonly RevisionSummary[]): Entry[] {
  const sent = letters.map((letter): Entry => ({
    key: `letter-${letter.number}`,
    at: letter.sentAt,
    triangle: null,
    content: (
      <a className="link" href={letter.href}>
        {letter.subject}
      </a>
    ),
  }));
  const filed = revisions.map((revision): Entry => ({
    key: `revision-${revision.letter}`,
    at: revision.filedAt,
    triangle: <RevisionTriangle letter={revision.letter} older={!revision.current} />,
    content: (
      <>
        {`Filed by ${revision.filedBy.name}`}
        <span className="block text-label text-ink-soft">{revision.change}</span>
        <RevisionFiles number={number} letter={revision.letter} />
      </>
    ),
  }));
  return [...sent, ...filed].sort((a, b) => b.at.localeCompare(a.at));
}

interface LettersAndRevisionsProps {
  number: string;
  letters: readonly Letter[];
  revisions: readonly RevisionSummary[];
}

/** Every filing and every letter, newest first. */
export function LettersAndRevisions({ number, letters, revisions }: LettersAndRevisionsProps) {
  const all = entries(number, letters, revisions);
  return (
    <Sheet title="Letters and revisions">
      {all.length === 0 ? (
        <p className="sheet-body text-control text-ink-soft">
          Nothing is filed yet. Each filing and each letter will stand here.
        </p>
      ) : (
        <ul className="pb-2">
          {all.map((entry) => (
            <li
              key={entry.key}
              className="grid grid-cols-[24px_minmax(0,1fr)_auto] items-center gap-3 border-t border-rule px-4 py-2 text-table field:px-6"
            >
              <span>{entry.triangle}</span>
              <span>{entry.content}</span>
              <span className="text-ink-soft">{formatDate(entry.at)}</span>
            </li>
          ))}
        </ul>
      )}
    </Sheet>
  );
}
