import type { Cause } from '#shared/contracts/api.generated';
import { figure } from '#shared/format/numbers';
import { parameterName } from '../../../components/charts/balance-entries';
import { CauseLine } from '../../../components/charts/cause-line';
import { FindingSays } from '../../../components/charts/finding-says';
import { ButtonLink } from '../../../components/ui/button';
import { GradeMark } from '../../../components/ui/grade-mark';
import type { Matter } from '../model/matters';

const unitOf = (parameter: string): string => (parameter.startsWith('b') ? 'µS/km' : 'Ω/km');

/** Fields of the geometry as the button calls them, each with its unit; the cause line beside it names the place. */
const ENTRIES: Readonly<Record<string, readonly [unit: string, field: string]>> = {
  horizontalM: ['\u2009m', 'offset'],
  attachmentHeightM: ['\u2009m', 'height'],
  sagM: ['\u2009m', 'sag'],
  bundleCount: ['', 'number of subconductors'],
  bundleSpacingM: ['\u2009m', 'bundle spacing'],
  diameterMm: ['\u2009mm', 'diameter'],
  gmrMm: ['\u2009mm', 'GMR'],
};

function entryWords(name: string, value: number): string {
  const [unit, field] = ENTRIES[name] ?? ['', 'geometry'];
  return `Put ${name === 'bundleCount' ? value : figure(value, 4)}${unit} into the ${field}`;
}

/** What the button says: the value and its field where there is one, else how many. */
function putWords({ in: place, corrected = {} }: Cause): string {
  const entries = Object.entries(corrected);
  const [first] = entries;
  if (!first) return '';
  if (entries.length > 1) return `Put these ${entries.length} values in`;
  const [name, value] = first;
  if (place === 'geometry') return entryWords(name, value);
  return `Put ${figure(value, 4)}\u2009${unitOf(name)} into ${parameterName(name)}`;
}

/** "Same cause: R1, B1 and R0." */
function othersWords({ others }: Matter): string | null {
  const names = [...new Set(others.flatMap((f) => (f.parameter ? [parameterName(f.parameter)] : [])))];
  if (names.length === 0) return null;
  const last = names.at(-1) ?? '';
  return `Same cause: ${names.length === 1 ? last : `${names.slice(0, -1).join(', ')} and ${last}`}.`;
}

interface CauseOfferProps {
  number: string;
  matter: Matter;
  /** Whether there is a draft to put a value into. */
  open: boolean;
}

/** A matter of a discrepancy: what was found, what would explain it, and the way to put the correction in. */
export function CauseOffer({ number, matter, open }: CauseOfferProps) {
  const { first, causes } = matter;
  const best = causes.find((c) => Object.keys(c.corrected ?? {}).length > 0);
  const put = best && {
    correction: { in: best.in, corrected: best.corrected ?? {}, where: best.where },
    circuit: first.circuit ?? 1,
  };
  const others = othersWords(matter);
  return (
    <div className="mt-3 grid items-center gap-3 border border-rule-strong px-3.5 py-2.5 text-table field:grid-cols-[minmax(0,1fr)_auto]">
      <div>
        <div className="font-semibold">
          <FindingSays message={first.message} />
        </div>
        {causes.map((cause, i) => (
          <CauseLine key={i} grade={first.grade}>
            {cause.sentence}
          </CauseLine>
        ))}
        {others && <p className="mt-1 text-ink-soft">{others}</p>}
      </div>
      {put && open && (
        <ButtonLink small to={`/applications/${number}/lines/${first.lineKey}`} state={{ put }}>
          {putWords(best)}
        </ButtonLink>
      )}
    </div>
  );
}

/** Findings of a discrepancy that no slip explains, one a line. */
export function PlainFindings({ matters }: { matters: readonly Matter[] }) {
  if (matters.length === 0) return null;
  return (
    <ul className="mt-3 grid gap-1.5 text-table">
      {matters.flatMap(({ first, others }) =>
        [first, ...others].map((finding) => (
          <li key={finding.fingerprint} className="grid grid-cols-[14px_minmax(0,1fr)] gap-2">
            <span className="mt-0.5">
              <GradeMark grade={finding.grade} />
            </span>
            <span>{finding.message}</span>
          </li>
        )),
      )}
    </ul>
  );
}
