import { checkLine } from '#shared/checks/check-line';
import { readLine } from '#shared/filing/read-filing';
import type { CheckBasis, CheckOutcome, CheckQuestion } from './messages';

/** Reads a line and checks it by the same code and rules as the server. */
export function checkDraftLine(question: CheckQuestion, { rules, library }: CheckBasis): CheckOutcome {
  const { owner } = rules;
  const { line, written } = question;
  const read = readLine(line, { library, owner, written });
  if (!read.ok) return { kind: 'faults', faults: read.faults };
  return { kind: 'report', report: checkLine(read.line, rules, { library: library.conductors }) };
}
