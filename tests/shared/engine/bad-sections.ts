import type { ConductorData, Failure, OverheadSection, Result } from '#shared/engine/index';
import { buildLine } from './random-lines';

/** A section in good order, which the tests of bad input spoil in one place each. */
export const good = buildLine({
  circuits: 1,
  bundleCount: 2,
  groundWires: 2,
  tube: false,
  segmented: false,
  spacing: 0.4,
  height: 0.4,
  sag: 0.5,
  diameter: 0.5,
  resistivity: 0.4,
  skew: 0.2,
});

type Position = OverheadSection['positions'][number];

/** The good section with one position changed. */
export function withPosition(index: number, change: Record<string, unknown>): OverheadSection {
  return {
    ...good,
    positions: good.positions.map((p, i) => (i === index ? ({ ...p, ...change } as Position) : p)),
  };
}

export function withConductor(index: number, change: Record<string, unknown>): OverheadSection {
  const conductor = { ...good.positions[index]?.conductor, ...change } as ConductorData;
  return withPosition(index, { conductor });
}

export function failure(result: Result<unknown>): Failure {
  if (result.ok) throw new Error('was computed');
  return result;
}

export const TUBE = { model: 'tube', dcResistance20OhmPerKm: 0.07, temperatureC: 50, diameterMm: 28 };
