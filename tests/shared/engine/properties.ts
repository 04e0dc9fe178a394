import fc from 'fast-check';
import {
  sectionMatrices,
  solveSection,
  type OverheadSection,
  type SectionConstants,
  type SectionMatrices,
} from '#shared/engine/index';
import { buildLine, type LineDice } from './random-lines';

const unit = fc.double({ min: 0, max: 1, noNaN: true });

/** Lines that could stand: up to two circuits, bundles of up to four, up to three ground wires. */
export const dice: fc.Arbitrary<LineDice> = fc.record({
  circuits: fc.constantFrom(1 as const, 1 as const, 2 as const),
  bundleCount: fc.integer({ min: 1, max: 4 }),
  groundWires: fc.integer({ min: 0, max: 3 }),
  tube: fc.boolean(),
  segmented: fc.boolean(),
  spacing: unit,
  height: unit,
  sag: unit,
  diameter: unit,
  resistivity: unit,
  skew: unit,
});

/** A fixed seed: the same lines on every machine; change it to look at others. */
export const RUNS = { numRuns: 200, seed: 20_260 };

export function holds(property: (s: OverheadSection, d: LineDice) => void, runs = RUNS): void {
  fc.assert(
    fc.property(dice, (d) => property(buildLine(d), d)),
    runs,
  );
}

export function constants(s: OverheadSection, frequencyHz = 60): SectionConstants {
  const result = solveSection(s, frequencyHz);
  if (!result.ok) throw new Error(`${result.reason}: ${result.detail}`);
  return result.value;
}

export function matrices(s: OverheadSection, frequencyHz = 60): SectionMatrices {
  const result = sectionMatrices(s, frequencyHz);
  if (!result.ok) throw new Error(`${result.reason}: ${result.detail}`);
  return result.value;
}

export function mapPositions(
  s: OverheadSection,
  change: (p: OverheadSection['positions'][number]) => typeof p,
): OverheadSection {
  return { ...s, positions: s.positions.map(change) };
}

/** Largest relative difference of all values of two solutions. */
export function apart(a: SectionConstants, b: SectionConstants): number {
  let most = 0;
  a.circuits.forEach((v, c) => {
    const w = b.circuits[c];
    if (!w) throw new Error('circuit missing');
    for (const key of ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const) {
      most = Math.max(most, Math.abs(v[key] - w[key]) / Math.max(Math.abs(w[key]), 0.01));
    }
  });
  return most;
}
