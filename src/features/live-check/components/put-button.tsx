import type { Cause, Finding } from '#shared/checks/types';
import { figure } from '#shared/format/numbers';
import { Button } from '../../../components/ui/button';
import { parameterName } from '../../../components/charts/balance-entries';

/** Puts a cause's correction into the form, for the applicant to confirm. */
export type OnPut = (cause: Cause, circuit: number | undefined) => void;

const unitOf = (parameter: string): string => (parameter.startsWith('b') ? 'µS/km' : 'Ω/km');

/** What the button says: the value and its field where there is one, else how many. */
export function putWords({ in: where, corrected }: Pick<Cause, 'in' | 'corrected'>): string {
  const entries = Object.entries(corrected);
  const [first] = entries;
  if (!first || entries.length > 1) return entries.length > 1 ? `Put these ${entries.length} values in` : '';
  const [name, value] = first;
  if (where === 'geometry') return `Put ${figure(value, 4)} in`;
  return `Put ${figure(value, 4)}\u2009${unitOf(name)} into ${parameterName(name)}`;
}

/** The best cause of a finding as a button; a finding without one has none. */
export function PutButton({ finding, onPut }: { finding: Finding; onPut: OnPut }) {
  const cause = finding.causes.find((c) => Object.keys(c.corrected).length > 0);
  if (!cause) return null;
  return (
    <Button small onClick={() => onPut(cause, finding.circuit)}>
      {putWords(cause)}
    </Button>
  );
}
