import type {
  ConductorForm,
  DeclaredForm,
  DeclaredTyped,
  GroundWireForm,
  LineForm,
  MutualForm,
  PhaseForm,
  PhaseName,
  RatingForm,
  SectionForm,
  SequenceTyped,
  Typed,
} from './form-types';

/** An empty field in the unit that the filing format keeps. */
export const typed = (unit: string, text = ''): Typed => ({ text, unit });

export const blankDeclaredValue = (unit: string): DeclaredTyped => ({
  ...typed(unit),
  baseMva: '',
  baseKv: '',
});

export const blankSequence = (): SequenceTyped => ({
  r1: blankDeclaredValue('ohm/km'),
  x1: blankDeclaredValue('ohm/km'),
  b1: blankDeclaredValue('uS/km'),
  r0: blankDeclaredValue('ohm/km'),
  x0: blankDeclaredValue('ohm/km'),
  b0: blankDeclaredValue('uS/km'),
});

export const blankMutual = (): MutualForm => ({
  r0m: blankDeclaredValue('ohm/km'),
  x0m: blankDeclaredValue('ohm/km'),
  b0m: blankDeclaredValue('uS/km'),
});

export const blankRating = (): RatingForm => ({
  season: '',
  continuousA: typed('A'),
  emergencyA: typed('A'),
});

export const blankDeclared = (circuit: number): DeclaredForm => ({
  circuit,
  circuitId: '',
  ...blankSequence(),
  ratingA: typed('A'),
  maxTemperatureC: typed('degC'),
  ratings: [],
  basis: { kind: '', status: '', engineer: '', date: '' },
});

export const blankConductor = (): ConductorForm => ({
  source: 'library',
  library: '',
  name: '',
  model: 'handbook',
  diameterMm: typed('mm'),
  coreDiameterMm: typed('mm'),
  gmrMm: typed('mm'),
  acResistanceOhmPerKm: typed('ohm/km'),
  dcResistance20OhmPerKm: typed('ohm/km'),
  temperatureC: typed('degC'),
  temperatureCoefficientPerK: typed('1/K'),
  aluminiumArea: typed('mm2'),
});

export const blankPhase = (circuit: number, phase: PhaseName, lengthUnit = 'm'): PhaseForm => ({
  kind: 'phase',
  circuit,
  phase,
  conductor: 'phase',
  horizontalM: typed(lengthUnit),
  attachmentHeightM: typed(lengthUnit),
  sagM: typed(lengthUnit),
  bundleCount: '1',
  bundleSpacingM: typed('m'),
});

export const blankGroundWire = (lengthUnit = 'm'): GroundWireForm => ({
  kind: 'ground-wire',
  conductor: 'ground',
  horizontalM: typed(lengthUnit),
  attachmentHeightM: typed(lengthUnit),
  sagM: typed(lengthUnit),
});

export const PHASES: readonly PhaseName[] = ['a', 'b', 'c'];

export function blankSection(circuits: 1 | 2): SectionForm {
  const numbers = circuits === 2 ? [1, 2] : [1];
  return {
    kind: 'overhead',
    lengthKm: typed('km'),
    earthResistivityOhmM: typed('ohm m'),
    groundWireBonding: 'continuous',
    hasGeometry: true,
    conductors: { phase: blankConductor() },
    positions: numbers.flatMap((c) => PHASES.map((p) => blankPhase(c, p))),
    perLength: numbers.map(() => blankSequence()),
  };
}

export function blankLine(): LineForm {
  return {
    name: '',
    from: '',
    to: '',
    nominalVoltageKv: typed('kV'),
    frequencyHz: '60',
    transposed: true,
    circuits: 1,
    sections: [blankSection(1)],
    declared: [blankDeclared(1)],
    declaredMutual: blankMutual(),
  };
}
