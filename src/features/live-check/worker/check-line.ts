import { checkLine } from '#shared/checks/check-line';
import { checkPartialLine } from '#shared/checks/check-partial-line';
import { readLine } from '#shared/filing/read-filing';
import { readPartialLine } from '#shared/filing/read-partial-line';
import type { CheckBasis, CheckOutcome, CheckQuestion } from './messages';

/**
 * Reads a line and checks it by the same code and rules as the server; of a line that is still being written, the
 * parts that hold.
 */
export function checkDraftLine(question: CheckQuestion, { rules, library }: CheckBasis): CheckOutcome {
  const { owner } = rules;
  const { line, written } = question;
  const options = { library: library.conductors };
  const context = { library, owner, written };
  const read = readLine(line, context);
  if (read.ok) return { kind: 'report', report: checkLine(read.line, rules, options) };
  const partial = readPartialLine(line, read.faults, context);
  const preview = partial && {
    report: checkPartialLine(partial, rules, options),
    whole: partial.whole,
    sections: partial.line.sections.length,
  };
  return { kind: 'faults', faults: read.faults, preview };
}
