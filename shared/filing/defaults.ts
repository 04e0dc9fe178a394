/** What a filing means by what it leaves out. */
import type {
  Conductor,
  DeclaredCircuit,
  FilingLine,
  Position,
  Section,
} from '../contracts/filing.generated';
import { isOnBase } from '../units/declared-units';
import type { QuantityKind } from '../units/declared-units';
import type { Notice, OwnerDefaults } from './types';

/** Defaults of the format; the earth resistivity and the power base are the owner's. */
export const DEFAULTS = {
  format: 'filing/1',
  transposed: true,
  kind: 'overhead',
  groundWireBonding: 'continuous',
  sagM: 0,
  bundleCount: 1,
  temperatureCoefficientPerK: 0.00403,
} as const;

/** The declared fields of a circuit, of a coupling and of a cable, each with the quantity that it is. */
export const DECLARED_KINDS: Readonly<Record<string, QuantityKind>> = {
  r1: 'resistance',
  x1: 'reactance',
  b1: 'susceptance',
  r0: 'resistance',
  x0: 'reactance',
  b0: 'susceptance',
  r0m: 'resistance',
  x0m: 'reactance',
  b0m: 'susceptance',
};

/** A line with its defaults filled in, and what of it was assumed. */
export interface Filled {
  line: FilingLine;
  /** JSON Pointers within the line of values that the owner's settings filled in. */
  assumed: string[];
  notices: Notice[];
}

/** A declared value in whatever unit. */
interface Quantity {
  value: number;
  unit: string;
  baseMva?: number;
  baseKv?: number;
}

/** A conductor's own defaults: aluminium's coefficient, a solid wire for a tube. */
function conductor(c: Conductor): Conductor {
  const tube = c.model === 'tube' ? { coreDiameterMm: 0 } : {};
  return { ...tube, temperatureCoefficientPerK: DEFAULTS.temperatureCoefficientPerK, ...c };
}

/** A position's defaults: no sag, one conductor. */
function position(p: Position): Position {
  const sag = { sagM: DEFAULTS.sagM };
  return p.groundWire ? { ...sag, ...p } : { ...sag, bundleCount: DEFAULTS.bundleCount, ...p };
}

/** Fills in one line and remembers what it took from the owner's settings. */
class Filler {
  readonly assumed: string[] = [];
  readonly notices: Notice[] = [];

  constructor(
    private readonly line: FilingLine,
    private readonly owner: OwnerDefaults,
  ) {}

  /** Notes that a value is the owner's and not the applicant's. */
  private assume(pointer: string, code: Notice['code'], message: string): void {
    this.assumed.push(pointer);
    this.notices.push({ code, pointer, message });
  }

  /** A section with its defaults; a cable has none but the base of its values. */
  section(s: Section, at: string): Section {
    if (s.kind === 'cable') return { ...s, perLength: this.cable(s.perLength, `${at}/perLength`) };
    const filled: Section = {
      kind: DEFAULTS.kind,
      groundWireBonding: DEFAULTS.groundWireBonding,
      earthResistivityOhmM: this.owner.earthResistivityOhmM,
      ...s,
    };
    if (s.earthResistivityOhmM === undefined)
      this.assume(
        `${at}/earthResistivityOhmM`,
        'earth-resistivity-default',
        `Earth resistivity is not given: the owner’s ${this.owner.earthResistivityOhmM}\u2009Ω·m is used.`,
      );
    if (s.conductors)
      filled.conductors = Object.fromEntries(Object.entries(s.conductors).map(([k, c]) => [k, conductor(c)]));
    if (s.positions) filled.positions = s.positions.map(position);
    return filled;
  }

  /** Fills in the base of every pu and % value of a circuit, a coupling or a cable. */
  values<T extends object>(entry: T, at: string): T {
    const rows = Object.entries(entry).map(([key, value]: [string, unknown]) => {
      const kind = Object.hasOwn(DECLARED_KINDS, key) ? DECLARED_KINDS[key] : undefined;
      return [key, kind && value ? this.quantity(value as Quantity, kind, `${at}/${key}`) : value];
    });
    return Object.fromEntries(rows) as T;
  }

  /** A value with its base, where its unit stands on one. */
  private quantity(q: Quantity, kind: QuantityKind, at: string): Quantity {
    if (!isOnBase(kind, q.unit)) return q;
    const filled = { baseMva: this.owner.baseMva, baseKv: this.line.nominalVoltageKv, ...q };
    const left = [q.baseMva === undefined && 'MVA', q.baseKv === undefined && 'kV'].filter(Boolean);
    if (left.length > 0)
      this.assume(
        at,
        'base-default',
        `The base of this ${q.unit} value is not given in ${left.join(' and ')}: ` +
          `${filled.baseMva}\u2009MVA and ${filled.baseKv}\u2009kV are used.`,
      );
    return filled;
  }

  /** A cable's values, one set or one a circuit. */
  private cable(values: Section['perLength'], at: string): Section['perLength'] {
    if (Array.isArray(values)) return values.map((v, i) => this.values(v, `${at}/${i}`));
    return values && this.values(values, at);
  }
}

/**
 * Fills in what a line leaves out. Library conductors must be resolved before.
 * @param line a line that holds by schema
 * @param owner the owner's earth resistivity (Ω·m) and power base (MVA)
 */
export function withDefaults(line: FilingLine, owner: OwnerDefaults): Filled {
  const fill = new Filler(line, owner);
  const filled: FilingLine = {
    ...line,
    transposed: line.transposed ?? DEFAULTS.transposed,
    sections: line.sections.map((s, i) => fill.section(s, `/sections/${i}`)),
    declared: line.declared.map((d, i): DeclaredCircuit => fill.values(d, `/declared/${i}`)),
  };
  if (line.declaredMutual)
    filled.declaredMutual = line.declaredMutual.map((m, i) => fill.values(m, `/declaredMutual/${i}`));
  return { line: filled, assumed: fill.assumed, notices: fill.notices };
}
