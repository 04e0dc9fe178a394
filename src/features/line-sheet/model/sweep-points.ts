import type { SweepTable } from '#shared/engine/index';

export type Quantity = 'r1' | 'l1' | 'r0' | 'l0';

/** One quantity of one circuit as points of a plot, [Hz, value]; what cannot stand on a logarithmic axis is left out. */
export function sweepPoints(table: SweepTable, circuit: number, quantity: Quantity): [number, number][] {
  const column = table.circuits[circuit - 1]?.[quantity];
  if (!column) return [];
  return Array.from(table.frequenciesHz, (hz, i): [number, number] => [hz, column[i] ?? 0]).filter(
    ([, value]) => value > 0,
  );
}

/** The inductance that goes with a reactance, mH/km. */
export function inductanceMilliHenryPerKm(x: number, frequencyHz: number): number {
  return (x / (2 * Math.PI * frequencyHz)) * 1000;
}

const CONDUCTORS: Readonly<Record<SweepTable['conductors'], string>> = {
  tube: 'All conductors are taken as tubes with skin effect.',
  mixed:
    'Conductors whose data allow it are taken as tubes with skin effect; the others keep the resistance and GMR of their table at every frequency.',
  'as-filed':
    'The filed data hold no d.c. resistance: all conductors keep the resistance and GMR of their table at every frequency, so that their skin effect is left out.',
};

/** What the curves assume, as sentences under them. */
export function sweepAssumptions(table: SweepTable, earthResistivityOhmM: number): string {
  return `${CONDUCTORS[table.conductors]} Uniform earth of ${earthResistivityOhmM} Ω m after Carson; displacement current in the earth is left out.`;
}
