import type { Cause, Finding } from '#shared/contracts/api.generated';
import { figure } from '#shared/format/numbers';
import { CauseLine } from '../../../components/charts/cause-line';
import { ButtonLink } from '../../../components/ui/button';
import { parameterName } from '../../../components/charts/balance-entries';

const unitOf = (parameter: string): string => (parameter.startsWith('b') ? 'µS/km' : 'Ω/km');

/** What the button says: the value and its field where there is one, else how many. */
function putWords({ in: place, corrected = {} }: Cause): string {
  const entries = Object.entries(corrected);
  const [first] = entries;
  if (!first) return '';
  if (entries.length > 1) return `Put these ${entries.length} values in`;
  const [name, value] = first;
  if (place === 'geometry') return `Put ${figure(value, 4)} in`;
  return `Put ${figure(value, 4)}\u2009${unitOf(name)} into ${parameterName(name)}`;
}

interface CauseOfferProps {
  number: string;
  finding: Finding;
  /** Whether there is a draft to put it into. */
  open: boolean;
}

/** What a finding says and what would explain it, with the way to put the corrected value into the draft. */
export function CauseOffer({ number, finding, open }: CauseOfferProps) {
  const best = finding.causes.find((c) => Object.keys(c.corrected ?? {}).length > 0);
  const put = best && {
    correction: { in: best.in, corrected: best.corrected ?? {}, where: best.where },
    circuit: finding.circuit ?? 1,
  };
  return (
    <div className="mt-3 grid items-center gap-3 border border-rule-strong px-3.5 py-2.5 text-table field:grid-cols-[minmax(0,1fr)_auto]">
      <div>
        <p className="font-semibold">{finding.message}</p>
        {finding.causes.map((cause, i) => (
          <CauseLine key={i} grade={finding.grade}>
            {cause.sentence}
          </CauseLine>
        ))}
      </div>
      {put && open && (
        <ButtonLink small to={`/applications/${number}/lines/${finding.lineKey}`} state={{ put }}>
          {putWords(best)}
        </ButtonLink>
      )}
    </div>
  );
}
