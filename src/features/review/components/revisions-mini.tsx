import { Link } from 'react-router-dom';
import { formatDate } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import { useRevisions } from '../../../lib/queries/list-revisions';

interface RevisionsMiniProps {
  number: string;
  shown: string;
  hrefOf: (letter: string) => string;
}

/** The revisions that were filed, each with what changed, and the way to compare it with the one before. */
export function RevisionsMini({ number, shown, hrefOf }: RevisionsMiniProps) {
  const { items } = useRevisions(number);
  return (
    <Sheet side title="Revisions">
      <ul className="mini-list">
        {items.map((revision, i) => {
          const before = items[i + 1];
          return (
            <li key={revision.letter} className="items-center">
              <RevisionTriangle letter={revision.letter} older={!revision.current} />
              <Link
                className="link-ink"
                to={hrefOf(revision.letter)}
                aria-current={revision.letter === shown ? 'true' : undefined}
              >
                {formatDate(revision.filedAt)}
              </Link>
              {before ? (
                <Link
                  className="link"
                  to={`/applications/${number}/compare?from=${before.letter}&to=${revision.letter}`}
                  aria-label={`Compare revision ${revision.letter} with ${before.letter}`}
                >
                  compare
                </Link>
              ) : (
                <span />
              )}
              <span className="mini-more">{revision.change}</span>
            </li>
          );
        })}
      </ul>
    </Sheet>
  );
}
