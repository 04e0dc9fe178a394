import { solveSection } from '../../engine/index';
import type {
  CableSection,
  LineInput,
  LineSection,
  OverheadSection,
  SectionConstants,
  SequenceConstants,
} from '../../engine/index';
import type { Values } from './problem';

/** What one version of a line gives: a set of values a circuit, and one a pair. */
export interface Outcome {
  circuits: Values[];
  pairs: Values[];
}

/** Changes one overhead section; null leaves it as it is. */
export type SectionChange = (section: OverheadSection, index: number) => OverheadSection | null;

const SEQUENCE = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;

/**
 * Re-runs the engine on changed versions of one line. Sections that a change leaves alone are not solved again.
 */
export class Bench {
  readonly lengthKm: number;
  private readonly filed: (SectionConstants | null)[];

  /**
   * @param line the line as filed
   */
  constructor(readonly line: LineInput) {
    this.lengthKm = line.sections.reduce((sum, section) => sum + section.lengthKm, 0);
    this.filed = line.sections.map((section) => this.solve(section, line.frequencyHz));
  }

  /** The line as filed; null where it cannot be computed. */
  asFiled(): Outcome | null {
    return this.mean(this.filed);
  }

  /**
   * The line with some overhead sections changed.
   *
   * @param change what to do to a section
   * @param frequencyHz another frequency than the line's
   * @returns null when nothing changed or the changed line cannot be computed
   */
  changed(change: SectionChange, frequencyHz = this.line.frequencyHz): Outcome | null {
    const isSame = frequencyHz === this.line.frequencyHz;
    let touched = !isSame;
    const parts = this.line.sections.map((section, index) => {
      const other = section.kind === 'overhead' ? change(section, index) : null;
      if (other !== null) touched = true;
      else if (isSame) return this.filed[index] ?? null;
      return this.solve(other ?? section, frequencyHz);
    });
    return touched ? this.mean(parts) : null;
  }

  private solve(section: LineSection, frequencyHz: number): SectionConstants | null {
    if (section.kind === 'cable') return cable(section, frequencyHz / this.line.frequencyHz);
    const result = solveSection(section, frequencyHz);
    return result.ok ? result.value : null;
  }

  private mean(parts: readonly (SectionConstants | null)[]): Outcome | null {
    const outcome: Outcome = { circuits: [], pairs: [] };
    for (const [index, part] of parts.entries()) {
      if (part === null) return null;
      const weight = (this.line.sections[index]?.lengthKm ?? 0) / this.lengthKm;
      part.circuits.forEach((constants, circuit) => addCircuit(outcome, circuit, constants, weight));
      part.mutual.forEach(({ r0m, x0m, b0m }, pair) => {
        const sum = (outcome.pairs[pair] ??= { r0m: 0, x0m: 0, b0m: 0 });
        sum.r0m = (sum.r0m ?? 0) + r0m * weight;
        sum.x0m = (sum.x0m ?? 0) + x0m * weight;
        sum.b0m = (sum.b0m ?? 0) + b0m * weight;
      });
    }
    return outcome;
  }
}

function addCircuit(outcome: Outcome, circuit: number, constants: SequenceConstants, weight: number): void {
  const sum = (outcome.circuits[circuit] ??= {});
  for (const key of SEQUENCE) sum[key] = (sum[key] ?? 0) + constants[key] * weight;
}

function cable(section: CableSection, ratio: number): SectionConstants {
  const circuits = section.perLength.map((values) => ({
    ...values,
    x1: values.x1 * ratio,
    b1: values.b1 * ratio,
    x0: values.x0 * ratio,
    b0: values.b0 * ratio,
  }));
  return { circuits, mutual: [] };
}
