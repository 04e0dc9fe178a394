import { Link } from 'react-router-dom';
import type { LineSummary } from '#shared/contracts/api.generated';
import { fixed, THIN_SPACE } from '#shared/format/numbers';
import { GradeCountsInline } from '../../../components/ui/grade-counts';

interface LinesNavProps {
  lines: readonly LineSummary[];
  shown: string | null;
  hrefOf: (lineKey: string) => string;
}

const CHANGE_WORDS: Partial<Record<LineSummary['change'], string>> = { new: 'new', changed: 'changed' };

/** The lines of a revision with what still stands on each. */
export function LinesNav({ lines, shown, hrefOf }: LinesNavProps) {
  return (
    <nav className="sheet sheet-side" aria-label="Lines of this application">
      <div className="sheet-head">
        <h2>Lines</h2>
        <p>{lines.length}</p>
      </div>
      <ul className="line-list">
        {lines.map((line) => (
          <li key={line.lineKey}>
            <Link
              to={hrefOf(line.lineKey)}
              preventScrollReset
              aria-current={line.lineKey === shown ? 'true' : undefined}
            >
              <span className="text-ink-soft">{line.lineKey}</span>
              <span className="font-semibold">{line.name}</span>
              <LineGrades line={line} />
              <span className="line-list-more">
                {`${line.nominalVoltageKv}${THIN_SPACE}kV, ${fixed(line.lengthKm, 1)}${THIN_SPACE}km`}
                {CHANGE_WORDS[line.change] && `, ${CHANGE_WORDS[line.change]}`}
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function LineGrades({ line: { grades } }: { line: LineSummary }) {
  if (grades === null) return <span className="text-label text-ink-soft">no check</span>;
  return (
    <GradeCountsInline
      counts={{ 'must-answer': grades.mustAnswer, explain: grades.explain, note: grades.note }}
    />
  );
}
