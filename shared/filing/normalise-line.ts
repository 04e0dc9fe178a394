/** A line that holds, turned into what the engine and the checks take. */
import type { PointerFault } from '../contracts/faults';
import type {
  Conductor,
  DeclaredCircuit,
  FilingLine,
  Position,
  Section,
} from '../contracts/filing.generated';
import { SEQUENCE_KEYS } from '../engine/types';
import type {
  ConductorData,
  GroundWirePosition,
  LineInput,
  PhasePosition,
  SequenceConstants,
} from '../engine/types';
import { circuitsOfLine } from './circuits';
import { declaredValues } from './declared-values';
import type { DeclaredContext } from './declared-values';
import { DEFAULTS } from './defaults';
import type {
  NormalisedCircuit,
  NormalisedLine,
  NormalisedMutual,
  NormalisedSection,
  WrittenDigits,
} from './types';

/** The values of a coupling, in the order in which they are always listed. */
const MUTUAL_KEYS = ['r0m', 'x0m', 'b0m'] as const;

/** What a line is normalised with. */
export interface LineContext {
  /** JSON Pointer of the line in the filing. */
  pointer: string;
  /** Digits as written, by pointer from the line. */
  written: WrittenDigits;
  /** Pointers from the line of values that the owner's settings filled in. */
  assumed: readonly string[];
}

/** The engine's data of each conductor: one object a section, however many positions hang it. */
function conductorData(conductors: Readonly<Record<string, Conductor>>): Record<string, ConductorData> {
  const rows = Object.entries(conductors).map(
    ([key, { library: _library, ...data }]): [string, ConductorData] => {
      // The schema has seen to it that model and diameter are there.
      return [key, { model: 'handbook', diameterMm: 0, ...data }];
    },
  );
  return Object.fromEntries(rows);
}

/** A position as the engine takes it: what the schema leaves open is filled in, a single conductor has no spacing. */
function enginePosition(
  p: Position,
  conductors: Readonly<Record<string, ConductorData>>,
): PhasePosition | GroundWirePosition {
  const place = {
    // The line's rules have seen to it that each position names a conductor of its section.
    conductor: conductors[p.conductor] ?? { model: 'handbook', diameterMm: 0 },
    horizontalM: p.horizontalM,
    attachmentHeightM: p.attachmentHeightM,
    sagM: p.sagM ?? DEFAULTS.sagM,
  };
  if (p.groundWire) return { kind: 'ground-wire', ...place };
  const bundleCount = p.bundleCount ?? DEFAULTS.bundleCount;
  return {
    kind: 'phase',
    circuit: p.circuit ?? 1,
    phase: p.phase ?? 'a',
    ...place,
    bundleCount,
    bundleSpacingM: bundleCount > 1 ? (p.bundleSpacingM ?? 0) : 0,
  };
}

/** Normalises one line; the faults that it meets are of values beyond reckoning only. */
class LineNormaliser {
  readonly faults: PointerFault[] = [];
  private readonly circuits: number[];
  private readonly lengthKm: number;

  constructor(
    private readonly line: FilingLine,
    private readonly context: LineContext,
  ) {
    this.circuits = circuitsOfLine(line);
    this.lengthKm = line.sections.reduce((sum, s) => sum + s.lengthKm, 0);
  }

  /** What declared values are converted with, whole-line ones over the given length in km. */
  private values(lengthKm: number): DeclaredContext {
    const { frequencyHz, nominalVoltageKv } = this.line;
    const { pointer, written } = this.context;
    return { frequencyHz, nominalVoltageKv, lengthKm, linePointer: pointer, written };
  }

  /** One set of constants a circuit; a cable that gives one set gives it to each. */
  private cable(s: Section, at: string): SequenceConstants[] {
    const perLength = s.perLength;
    return this.circuits.map((circuit) => {
      const many = Array.isArray(perLength);
      const index = many ? perLength.findIndex((v) => v.circuit === circuit) : -1;
      const entry = many ? perLength[index] : perLength;
      const pointer = many ? `${at}/perLength/${index}` : `${at}/perLength`;
      const found = entry
        ? declaredValues(entry, SEQUENCE_KEYS, pointer, this.values(s.lengthKm), this.faults)
        : {};
      const out: SequenceConstants = { r1: 0, x1: 0, b1: 0, r0: 0, x0: 0, b0: 0 };
      for (const key of SEQUENCE_KEYS) out[key] = found[key]?.perKm ?? 0;
      return out;
    });
  }

  /** A section by its kind: cable, without geometry, or overhead with it. */
  private section(s: Section, index: number): NormalisedSection {
    const pointer = `${this.context.pointer}/sections/${index}`;
    const { lengthKm } = s;
    if (s.kind === 'cable')
      return {
        kind: 'cable',
        pointer,
        lengthKm,
        input: { kind: 'cable', lengthKm, perLength: this.cable(s, pointer) },
      };
    const common = {
      earthResistivityOhmM: s.earthResistivityOhmM ?? 0,
      groundWireBonding: s.groundWireBonding ?? DEFAULTS.groundWireBonding,
    };
    const resistivityIsOwners = this.context.assumed.includes(`/sections/${index}/earthResistivityOhmM`);
    const { positions, conductors } = s;
    if (!positions || !conductors)
      return { kind: 'geometry-missing', pointer, lengthKm, ...common, resistivityIsOwners };
    const data = conductorData(conductors);
    const placed = positions.map((p) => enginePosition(p, data));
    return {
      kind: 'overhead',
      pointer,
      lengthKm,
      input: { kind: 'overhead', lengthKm, ...common, positions: placed },
      resistivityIsOwners,
    };
  }

  /** A declared circuit with its values in SI. */
  private circuit(d: DeclaredCircuit, index: number): NormalisedCircuit {
    const pointer = `${this.context.pointer}/declared/${index}`;
    const { circuit, circuitId, ratingA, maxTemperatureC, ratings, basis } = d;
    return {
      circuit,
      pointer,
      declared: declaredValues(d, SEQUENCE_KEYS, pointer, this.values(this.lengthKm), this.faults),
      ...(circuitId === undefined ? {} : { circuitId }),
      ...(ratingA === undefined ? {} : { ratingA }),
      ...(maxTemperatureC === undefined ? {} : { maxTemperatureC }),
      ratings: ratings ?? [],
      ...(basis === undefined ? {} : { basis }),
    };
  }

  /** The declared coupling, its circuits in ascending order: they have no direction. */
  private mutual(): NormalisedMutual[] {
    return (this.line.declaredMutual ?? []).map((m, i) => {
      const pointer = `${this.context.pointer}/declaredMutual/${i}`;
      const [one, two] = m.circuits;
      return {
        circuits: [Math.min(one, two), Math.max(one, two)],
        pointer,
        declared: declaredValues(m, MUTUAL_KEYS, pointer, this.values(this.lengthKm), this.faults),
      };
    });
  }

  /** The whole line. The engine gets it only when no section owes its geometry. */
  whole(): NormalisedLine {
    const { name, from, to, nominalVoltageKv, frequencyHz, transposed, sections, declared } = this.line;
    const normalised = sections.map((s, i) => this.section(s, i));
    const inputs = normalised.flatMap((s) => (s.kind === 'geometry-missing' ? [] : [s.input]));
    const cableKm = normalised.reduce((sum, s) => sum + (s.kind === 'cable' ? s.lengthKm : 0), 0);
    const engineInput: LineInput | null =
      inputs.length === normalised.length ? { frequencyHz, sections: inputs } : null;
    return {
      pointer: this.context.pointer,
      name,
      from,
      to,
      nominalVoltageKv,
      frequencyHz,
      transposed: transposed ?? DEFAULTS.transposed,
      lengthKm: this.lengthKm,
      cableShare: cableKm / this.lengthKm,
      circuitCount: this.circuits.length,
      sections: normalised,
      engineInput,
      circuits: declared.map((d, i) => this.circuit(d, i)),
      mutual: this.mutual(),
      sheet: { line: this.line, written: this.context.written, assumed: this.context.assumed },
    };
  }
}

/**
 * Turns a line that holds, with its defaults filled in and library data copied, into what the checks take.
 * @param line the complete line
 * @param context its pointer in the filing, digits as written, and what was assumed
 * @returns the line; faults name declared values too large to reckon with
 */
export function normaliseLine(
  line: FilingLine,
  context: LineContext,
): { line: NormalisedLine; faults: PointerFault[] } {
  const normaliser = new LineNormaliser(line, context);
  return { line: normaliser.whole(), faults: normaliser.faults };
}
