import type { LineReport } from '#shared/checks/types';
import type { RuleSet } from '#shared/checks/rule-set';
import type { PointerFault } from '#shared/contracts/faults';
import type { ConductorLibrary } from '#shared/library/types';

/** What every check of this page is made with; sent once, and again when it changes. */
export interface CheckBasis {
  rules: RuleSet;
  library: ConductorLibrary;
}

/** A line to be checked, as it stands in the form. */
export interface CheckQuestion {
  id: number;
  line: Record<string, unknown>;
  /** Digits as typed, by JSON Pointer within the line. */
  written: Readonly<Record<string, string>>;
}

export type ToWorker = { kind: 'basis'; basis: CheckBasis } | { kind: 'check'; question: CheckQuestion };

/** The check of what holds in a line that cannot be filed yet. */
export interface Preview {
  report: LineReport;
  /** Indices of the sections whose geometry is whole. */
  whole: readonly number[];
  /** How many sections the line has. */
  sections: number;
}

/** What came of a line: what keeps it from being filed, with the check of its parts; or what the check found. */
export type CheckOutcome =
  | { kind: 'faults'; faults: PointerFault[]; preview: Preview | null }
  | { kind: 'report'; report: LineReport };

export interface FromWorker {
  id: number;
  outcome: CheckOutcome;
}
