import type {
  ConductorData,
  GroundWirePosition,
  OverheadSection,
  Phase,
  PhasePosition,
} from '#shared/engine/types';
import table from '../../golden/engine/lines.json';

/** A position as the golden table writes it (the filing's format with its defaults left out). */
interface TablePosition {
  circuit?: number;
  phase?: string;
  groundWire?: boolean;
  conductor: string;
  horizontalM: number;
  attachmentHeightM: number;
  sagM?: number;
  bundleCount?: number;
  bundleSpacingM?: number;
}

interface TableSection {
  lengthKm: number;
  earthResistivityOhmM: number;
  groundWireBonding?: string;
  conductors: Record<string, unknown>;
  positions: TablePosition[];
}

/** Answers of the golden table at one frequency. */
export interface GoldenAnswer {
  frequencyHz: number;
  circuits: {
    z1OhmPerKm: number[];
    z0OhmPerKm: number[];
    b1MicrosiemensPerKm: number;
    b0MicrosiemensPerKm: number;
  }[];
  zeroSequenceMutualOhmPerKm?: number[];
  zeroSequenceMutualMicrosiemensPerKm?: number;
  phaseImpedanceOhmPerKm?: number[][][];
  phaseSusceptanceMicrosiemensPerKm?: number[][];
}

function toPosition(
  p: TablePosition,
  conductors: Record<string, unknown>,
): PhasePosition | GroundWirePosition {
  const place = {
    conductor: conductors[p.conductor] as ConductorData,
    horizontalM: p.horizontalM,
    attachmentHeightM: p.attachmentHeightM,
    sagM: p.sagM ?? 0,
  };
  if (p.groundWire) return { kind: 'ground-wire', ...place };
  return {
    kind: 'phase',
    circuit: p.circuit ?? 1,
    phase: p.phase as Phase,
    bundleCount: p.bundleCount ?? 1,
    bundleSpacingM: p.bundleSpacingM ?? 0,
    ...place,
  };
}

/** A section of the golden table as the engine takes it. */
export function toSection(s: TableSection): OverheadSection {
  return {
    kind: 'overhead',
    lengthKm: s.lengthKm,
    earthResistivityOhmM: s.earthResistivityOhmM,
    groundWireBonding: s.groundWireBonding === 'segmented' ? 'segmented' : 'continuous',
    positions: s.positions.map((p) => toPosition(p, s.conductors)),
  };
}

/** The 24 lines of the golden table: name, own frequency, section, answers at all frequencies given. */
export const goldenLines = table.filing.lines.map((line) => {
  const expected = table.expected.find((e) => e.name === line.name);
  if (!expected) throw new Error(`no answers for ${line.name}`);
  return {
    name: line.name,
    frequencyHz: line.frequencyHz,
    section: toSection(line.sections[0] as unknown as TableSection),
    answers: expected.answers as unknown as GoldenAnswer[],
  };
});
