import { solveLine } from '../../../shared/engine/index';
import type { LineConstants, SequenceConstants } from '../../../shared/engine/types';
import { readLine } from '../../../shared/filing/read-filing';
import { STARTING_LIBRARY } from '../../../shared/library/conductors';
import { STRUCTURES, type Structure, type StructureName } from './demo-structures';

/**
 * What somebody got wrong when the line's data were written down. `honest` is nothing, and so is `cable`, a stretch of
 * cable into the substation.
 */
export type Slip =
  | 'honest'
  | 'x1-per-mile'
  | 'all-per-mile'
  | 'x1-total'
  | 'other-frequency'
  | 'single-conductor'
  | 'half-charging'
  | 'position'
  | 'no-geometry'
  | 'cable';

export interface LineSpec {
  structure: StructureName;
  from: string;
  to: string;
  lengthKm: number;
  slip: Slip;
}

type Json = Record<string, unknown>;

const HZ = 60;
const KM_PER_MILE = 1.609344;
const OWNER = { baseMva: 100, earthResistivityOhmM: 100 };

/** A line as its applicant files it: true geometry, the engine's own constants, rounded, and then the slip. */
export function demoLine(spec: LineSpec): Json {
  const structure = STRUCTURES[spec.structure];
  const line = frameOf(spec, structure);
  const constants = constantsOf(line, structure, HZ);
  const declared = declaredOf(spec, structure, slipped(spec, line, structure, constants));
  return withSlipInGeometry(spec, { ...line, declared });
}

function frameOf({ from, to, lengthKm, slip }: LineSpec, structure: Structure): Json {
  const overheadKm = slip === 'cable' ? lengthKm - CABLE_KM : lengthKm;
  const overhead = {
    kind: 'overhead',
    lengthKm: rounded(overheadKm),
    earthResistivityOhmM: 100,
    groundWireBonding: 'continuous',
    conductors: {
      phase: { library: structure.conductor, temperatureC: structure.temperatureC },
      ground: { library: structure.groundWire, temperatureC: 25 },
    },
    positions: positionsOf(structure),
  };
  return {
    name: `${from} – ${to}`,
    from,
    to,
    nominalVoltageKv: structure.kv,
    frequencyHz: HZ,
    sections: slip === 'cable' ? [overhead, CABLE] : [overhead],
  };
}

const CABLE_KM = 1.8;

/** A short stretch into the substation, with values as a maker's sheet gives them. */
const CABLE = {
  kind: 'cable',
  lengthKm: CABLE_KM,
  perLength: [
    {
      circuit: 1,
      r1: { value: 0.0283, unit: 'ohm/km' },
      x1: { value: 0.187, unit: 'ohm/km' },
      b1: { value: 74.2, unit: 'uS/km' },
      r0: { value: 0.121, unit: 'ohm/km' },
      x0: { value: 0.094, unit: 'ohm/km' },
      b0: { value: 74.2, unit: 'uS/km' },
    },
  ],
};

function positionsOf(structure: Structure): Json[] {
  const { sagM, bundleCount, bundleSpacingM, groundWireSagM } = structure;
  const bundle = bundleCount > 1 ? { bundleCount, bundleSpacingM } : { bundleCount };
  return [
    ...structure.phases.map(([circuit, phase, horizontalM, attachmentHeightM]) => ({
      circuit,
      phase,
      conductor: 'phase',
      horizontalM,
      attachmentHeightM,
      sagM,
      ...bundle,
    })),
    ...structure.groundWires.map(([horizontalM, attachmentHeightM]) => ({
      groundWire: true,
      conductor: 'ground',
      horizontalM,
      attachmentHeightM,
      sagM: groundWireSagM,
    })),
  ];
}

function constantsOf(line: Json, structure: Structure, frequencyHz: number): LineConstants {
  const any = { value: 1, unit: 'ohm/km' };
  const circuits = circuitsOf(structure);
  const declared = circuits.map((circuit) => ({
    circuit,
    r1: any,
    x1: any,
    b1: { value: 1, unit: 'uS/km' },
  }));
  const read = readLine({ ...line, declared }, { library: STARTING_LIBRARY, owner: OWNER });
  if (!read.ok || read.line.engineInput === null) {
    throw new Error(`the demo's line ${String(line['name'])} cannot be read: ${JSON.stringify(read)}`);
  }
  const solved = solveLine(read.line.engineInput, frequencyHz);
  if (!solved.ok)
    throw new Error(`the demo's line ${String(line['name'])} cannot be computed: ${solved.detail}`);
  return solved.value;
}

const circuitsOf = (structure: Structure) => [...new Set(structure.phases.map(([circuit]) => circuit))];

/** The values that the applicant took for those of the line. */
function slipped(
  { slip, lengthKm }: LineSpec,
  line: Json,
  structure: Structure,
  constants: LineConstants,
): readonly SequenceConstants[] {
  const { circuits } = constants;
  const scaled = (factors: Partial<SequenceConstants>) =>
    circuits.map((values) => {
      const scale = (key: keyof SequenceConstants) => values[key] * (factors[key] ?? 1);
      return {
        r1: scale('r1'),
        x1: scale('x1'),
        b1: scale('b1'),
        r0: scale('r0'),
        x0: scale('x0'),
        b0: scale('b0'),
      };
    });
  switch (slip) {
    case 'x1-per-mile':
      return scaled({ x1: KM_PER_MILE });
    case 'all-per-mile': {
      const m = KM_PER_MILE;
      return scaled({ r1: m, x1: m, b1: m, r0: m, x0: m, b0: m });
    }
    case 'x1-total':
      return scaled({ x1: lengthKm });
    case 'half-charging':
      return scaled({ b1: 0.5, b0: 0.5 });
    case 'other-frequency':
      return constantsOf(line, structure, 50).circuits;
    case 'single-conductor':
      return constantsOf(withSingleConductors(line), structure, HZ).circuits;
    default:
      return circuits;
  }
}

function withSingleConductors(line: Json): Json {
  const sections = (line['sections'] as { positions: Json[] }[]).map((section) => ({
    ...section,
    positions: section.positions.map(({ bundleCount: _count, bundleSpacingM: _spacing, ...rest }) => rest),
  }));
  return { ...line, sections };
}

function declaredOf(spec: LineSpec, structure: Structure, values: readonly SequenceConstants[]): Json[] {
  return values.map((constants, i) => ({
    circuit: i + 1,
    r1: ohm(constants.r1),
    x1: ohm(constants.x1),
    b1: microsiemens(constants.b1),
    r0: ohm(constants.r0),
    x0: ohm(constants.x0),
    b0: microsiemens(constants.b0),
    ratingA: structure.ratingA,
    maxTemperatureC: 75,
    basis: { kind: 'calculated', status: 'design', engineer: 'R. Aske' },
    circuitId: `${initials(spec)}${i + 1}`,
  }));
}

const initials = ({ from, to }: LineSpec) => `${from} ${to}`.replace(/[a-z\s–-]/g, '');

/** Four significant digits, as people write them. */
const rounded = (value: number) => Number(value.toPrecision(4));
const ohm = (value: number) => ({ value: rounded(value), unit: 'ohm/km' });
const microsiemens = (value: number) => ({ value: rounded(value), unit: 'uS/km' });

function withSlipInGeometry({ slip }: LineSpec, line: Json): Json {
  const [section, ...others] = line['sections'] as Json[];
  if (section === undefined) return line;
  if (slip === 'no-geometry') {
    const { conductors: _conductors, positions: _positions, ...bare } = section;
    return { ...line, sections: [bare, ...others] };
  }
  if (slip !== 'position') return line;
  // two digits of one offset changed places, as in 6.0 typed as 0.6
  const positions = (section['positions'] as Json[]).map((position, i) =>
    i === 2 ? { ...position, horizontalM: rounded(Number(position['horizontalM']) / 10) } : position,
  );
  return { ...line, sections: [{ ...section, positions }, ...others] };
}
