import { solveLine } from '#shared/engine/index';
import type { LineConstants } from '#shared/engine/index';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { readFiling } from '#shared/filing/read-filing';
import type { NormalisedLine } from '#shared/filing/types';
import { STARTING_LIBRARY } from '#shared/library/conductors';

/** The filing format's own shapes, as loosely as a generator needs them. */
export interface ConductorJson {
  name?: string;
  model: 'handbook' | 'tube';
  diameterMm: number;
  coreDiameterMm?: number;
  gmrMm?: number;
  acResistanceOhmPerKm?: number;
  dcResistance20OhmPerKm?: number;
  temperatureC?: number;
  temperatureCoefficientPerK?: number;
}

export interface PositionJson {
  groundWire?: true;
  circuit?: number;
  phase?: 'a' | 'b' | 'c';
  conductor: string;
  horizontalM: number;
  attachmentHeightM: number;
  sagM: number;
  bundleCount?: number;
  bundleSpacingM?: number;
}

export interface SectionJson {
  kind: 'overhead';
  lengthKm: number;
  earthResistivityOhmM: number;
  groundWireBonding: 'continuous' | 'segmented';
  conductors: Record<string, ConductorJson>;
  positions: PositionJson[];
}

export interface QuantityJson {
  value: number;
  unit: string;
  baseMva?: number;
  baseKv?: number;
}

export type Key = 'r1' | 'x1' | 'b1' | 'r0' | 'x0' | 'b0';
export const KEYS: readonly Key[] = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'];

export type DeclaredJson = { circuit: number } & Record<Key, QuantityJson>;

export interface LineJson {
  name: string;
  from: string;
  to: string;
  nominalVoltageKv: number;
  frequencyHz: 50 | 60;
  sections: SectionJson[];
  declared: DeclaredJson[];
}

/** A line without declared values. */
export type Structure = Omit<LineJson, 'declared'>;

const unit = (key: Key): string => (key.startsWith('b') ? 'uS/km' : 'ohm/km');

/** Reads one line as the product does. */
export function readOne(line: LineJson): NormalisedLine {
  const result = readFiling(
    { format: 'filing/1', lines: [line] },
    { library: STARTING_LIBRARY, owner: DEFAULT_RULE_SET.owner },
  );
  if (!result.ok) throw new Error(JSON.stringify(result.faults[0]));
  const read = result.filing.lines[0];
  if (read === undefined) throw new Error('no line read');
  return read;
}

/** What the engine gives for a structure. */
export function solve(structure: Structure, frequencyHz?: number): LineConstants {
  const circuits = new Set(
    structure.sections.flatMap(({ positions }) => positions.flatMap(({ circuit }) => circuit ?? [])),
  );
  const declared = [...circuits].map((circuit) =>
    declare(circuit, { r1: 1, x1: 1, b1: 1, r0: 1, x0: 1, b0: 1 }),
  );
  const { engineInput } = readOne({ ...structure, declared });
  if (engineInput === null) throw new Error('no geometry');
  const solved = solveLine(engineInput, frequencyHz);
  if (!solved.ok) throw new Error(solved.detail);
  return solved.value;
}

/** A declared entry of per-length values. */
export function declare(circuit: number, values: Record<Key, number>): DeclaredJson {
  const entries = KEYS.map((key) => [key, { value: values[key], unit: unit(key) }]);
  return { circuit, ...(Object.fromEntries(entries) as Record<Key, QuantityJson>) };
}
