import { formatDate } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import { useApplicationLetters } from '../../../lib/queries/list-application-letters';
import { KIND_WORDS } from '../model/letter-words';
import { LetterLinks } from './letter-links';

/** The letters of one application, for its side column. */
export function CaseLetters({ number }: { number: string }) {
  const { items } = useApplicationLetters(number);
  if (items.length === 0) return null;
  return (
    <Sheet side title="Letters" aside={items.length}>
      <ul className="mini-list">
        {items.map((letter) => (
          <li key={letter.number} className="items-center">
            <RevisionTriangle letter={letter.revision} older />
            <span>{KIND_WORDS[letter.kind]}</span>
            <span className="text-ink-soft">{formatDate(letter.sentAt)}</span>
            <span className="mini-more">
              <LetterLinks letter={letter} />
            </span>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
