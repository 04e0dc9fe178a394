import type { Cause, Finding } from '#shared/checks/types';
import { Button } from '../../../components/ui/button';

/** Corrections as the form takes them. */
export interface Corrections {
  /** What a button would say that puts a cause's correction in; null where the form has no place for it. */
  offer: (cause: Cause, circuit: number | undefined) => string | null;
  /** Puts it into the form, for the applicant to confirm. */
  put: (cause: Cause, circuit: number | undefined) => void;
}

/** The best cause of a finding that can be put in, as a button; a finding without one has none. */
export function PutButton({ finding, corrections }: { finding: Finding; corrections: Corrections }) {
  const { causes, circuit } = finding;
  for (const cause of causes) {
    const words = corrections.offer(cause, circuit);
    if (words === null) continue;
    return (
      <Button small onClick={() => corrections.put(cause, circuit)}>
        {words}
      </Button>
    );
  }
  return null;
}
