import { blankConductor, blankDeclared, blankLine, blankMutual, blankSection, blankSequence } from './blank';
import type {
  AsTyped,
  ConductorForm,
  DeclaredForm,
  DeclaredTyped,
  LineForm,
  PositionForm,
  RatingForm,
  SectionForm,
  SequenceTyped,
  Typed,
} from './form-types';
import { MUTUAL_KEYS, SEQUENCE_KEYS } from './form-types';
import { fieldOf } from './leaf';
import {
  AREA_UNITS,
  DIAMETER_UNITS,
  GMR_UNITS,
  HEIGHT_UNITS,
  SPACING_UNITS,
  SPAN_UNITS,
  WIRE_RESISTANCE_UNITS,
  declaredUnits,
} from './unit-choices';
import type { UnitChoice } from './unit-choices';

type Json = Record<string, unknown>;

const object = (v: unknown): Json => (typeof v === 'object' && v !== null ? (v as Json) : {});
const list = (v: unknown): unknown[] => (Array.isArray(v) ? v : []);
const text = (v: unknown): string => (typeof v === 'string' ? v : '');
const token = (name: string): string => name.replace(/~/g, '~0').replace(/\//g, '~1');

/** Reads the fields of one object of the body, with the texts kept for them. */
class Reader {
  private readonly body: Json;
  constructor(
    body: unknown,
    private readonly pointer: string,
    private readonly kept: AsTyped,
  ) {
    this.body = object(body);
  }
  text(name: string): string {
    return text(this.body[name]);
  }
  list(name: string): unknown[] {
    return list(this.body[name]);
  }
  raw(name: string): unknown {
    return this.body[name];
  }
  has(name: string): boolean {
    return this.body[name] !== undefined;
  }
  inner(name: string, value: unknown = this.body[name]): Reader {
    return new Reader(value, `${this.pointer}/${name}`, this.kept);
  }
  number(name: string, unit: string, choices: readonly UnitChoice[] = []): Typed {
    const units = [unit, ...choices.map((c) => c.unit)];
    return fieldOf(this.body[name], unit, units, this.kept[`${this.pointer}/${name}`]);
  }
  plain(name: string): string {
    return this.number(name, '').text;
  }
}

function declaredValue(r: Reader, key: Parameters<typeof declaredUnits>[0], unit: string): DeclaredTyped {
  const inner = r.inner(key);
  const given = inner.text('unit');
  const known = declaredUnits(key).some((c) => c.unit === given);
  return {
    text: inner.plain('value'),
    unit: known ? given : unit,
    baseMva: inner.plain('baseMva'),
    baseKv: inner.plain('baseKv'),
  };
}

function sequence(r: Reader): SequenceTyped {
  const form = blankSequence();
  for (const key of SEQUENCE_KEYS) form[key] = declaredValue(r, key, blankSequence()[key].unit);
  return form;
}

function conductor(r: Reader): ConductorForm {
  const own = r.has('diameterMm') || r.has('model') || r.has('name');
  return {
    ...blankConductor(),
    source: own && !r.has('library') ? 'own' : 'library',
    library: r.text('library'),
    name: r.text('name'),
    model: r.raw('model') === 'tube' ? 'tube' : 'handbook',
    diameterMm: r.number('diameterMm', 'mm', DIAMETER_UNITS),
    coreDiameterMm: r.number('coreDiameterMm', 'mm', DIAMETER_UNITS),
    gmrMm: r.number('gmrMm', 'mm', GMR_UNITS),
    acResistanceOhmPerKm: r.number('acResistanceOhmPerKm', 'ohm/km', WIRE_RESISTANCE_UNITS),
    dcResistance20OhmPerKm: r.number('dcResistance20OhmPerKm', 'ohm/km', WIRE_RESISTANCE_UNITS),
    temperatureC: r.number('temperatureC', 'degC'),
    temperatureCoefficientPerK: r.number('temperatureCoefficientPerK', '1/K'),
    aluminiumArea: r.number('aluminiumArea', 'mm2', AREA_UNITS),
  };
}

function position(r: Reader): PositionForm {
  const ground = r.raw('groundWire') === true;
  const hanging = {
    conductor: r.text('conductor') || (ground ? 'ground' : 'phase'),
    horizontalM: r.number('horizontalM', 'm', HEIGHT_UNITS),
    attachmentHeightM: r.number('attachmentHeightM', 'm', HEIGHT_UNITS),
    sagM: r.number('sagM', 'm', HEIGHT_UNITS),
  };
  if (ground) return { kind: 'ground-wire', ...hanging };
  const phase = r.raw('phase');
  return {
    kind: 'phase',
    circuit: r.raw('circuit') === 2 ? 2 : 1,
    phase: phase === 'b' || phase === 'c' ? phase : 'a',
    ...hanging,
    bundleCount: r.plain('bundleCount') || '1',
    bundleSpacingM: r.number('bundleSpacingM', 'm', SPACING_UNITS),
  };
}

function conductorsOf(r: Reader): Record<string, ConductorForm> {
  const inner = r.inner('conductors');
  const names = Object.keys(object(r.raw('conductors')));
  return Object.fromEntries(names.map((n) => [n, conductor(inner.inner(token(n), inner.raw(n)))]));
}

function perLengthOf(r: Reader, circuits: 1 | 2): SequenceTyped[] {
  const given = r.raw('perLength');
  const entries = Array.isArray(given) ? given : given === undefined ? [] : [given];
  const numbers = circuits === 2 ? [0, 1] : [0];
  return numbers.map((i) => {
    const value = entries[i] ?? entries[0];
    return value === undefined ? blankSequence() : sequence(r.inner(`perLength/${i}`, value));
  });
}

function section(r: Reader, circuits: 1 | 2): SectionForm {
  const blank = blankSection(circuits);
  const kind = r.raw('kind') === 'cable' ? 'cable' : 'overhead';
  const hasGeometry = kind === 'cable' || r.has('positions');
  const positions = r.list('positions').map((p, i) => position(r.inner(`positions/${i}`, p)));
  const conductors = conductorsOf(r);
  for (const p of positions) conductors[p.conductor] ??= blankConductor();
  return {
    kind,
    lengthKm: r.number('lengthKm', 'km', SPAN_UNITS),
    earthResistivityOhmM: r.number('earthResistivityOhmM', 'ohm m'),
    groundWireBonding: r.raw('groundWireBonding') === 'segmented' ? 'segmented' : 'continuous',
    hasGeometry,
    conductors: positions.length > 0 ? conductors : blank.conductors,
    positions: positions.length > 0 ? positions : blank.positions,
    perLength: perLengthOf(r, circuits),
  };
}

function rating(r: Reader): RatingForm {
  return {
    season: r.text('season'),
    continuousA: r.number('continuousA', 'A'),
    emergencyA: r.number('emergencyA', 'A'),
  };
}

function declared(r: Reader, index: number): DeclaredForm {
  const circuit = r.raw('circuit');
  const basis = r.inner('basis');
  return {
    ...blankDeclared(circuit === 1 || circuit === 2 ? circuit : index + 1),
    circuitId: r.text('circuitId'),
    ...sequence(r),
    ratingA: r.number('ratingA', 'A'),
    maxTemperatureC: r.number('maxTemperatureC', 'degC'),
    ratings: r.list('ratings').map((v, i) => rating(r.inner(`ratings/${i}`, v))),
    basis: {
      kind: basis.text('kind'),
      status: basis.text('status'),
      engineer: basis.text('engineer'),
      date: basis.text('date'),
    },
  };
}

/** One or two circuits: as many as positions, cable values or declarations speak of. */
function circuitsOf(line: Json): 1 | 2 {
  const two = (v: unknown): boolean => object(v)['circuit'] === 2;
  const inSection = (s: unknown): boolean =>
    list(object(s)['positions']).some(two) || list(object(s)['perLength']).some(two);
  return list(line['declared']).some(two) || list(line['sections']).some(inSection) ? 2 : 1;
}

/** The form for a line of the filing format, complete or not, with the texts as they were typed. */
export function openForm(line: unknown, asTyped: AsTyped = {}): LineForm {
  const body = object(line);
  const r = new Reader(body, '', asTyped);
  const blank = blankLine();
  const circuits = circuitsOf(body);
  const sections = r.list('sections').map((s, i) => section(r.inner(`sections/${i}`, s), circuits));
  const entries = r.list('declared').map((d, i) => declared(r.inner(`declared/${i}`, d), i));
  const mutual = new Reader(r.list('declaredMutual')[0], '/declaredMutual/0', asTyped);
  const declaredMutual = blankMutual();
  for (const key of MUTUAL_KEYS) declaredMutual[key] = declaredValue(mutual, key, declaredMutual[key].unit);
  return {
    name: r.text('name'),
    from: r.text('from'),
    to: r.text('to'),
    nominalVoltageKv: r.number('nominalVoltageKv', 'kV'),
    frequencyHz: r.raw('frequencyHz') === 50 ? '50' : r.raw('frequencyHz') === 60 ? '60' : blank.frequencyHz,
    transposed: r.raw('transposed') !== false,
    circuits,
    sections: sections.length > 0 ? sections : [blankSection(circuits)],
    declared: entries.length > 0 ? entries : [blankDeclared(1)],
    declaredMutual,
  };
}
