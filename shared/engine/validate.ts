import { resistanceGrowth } from './conductor';
import { FREQUENCY_RANGE_HZ, MAX_BUNDLE, MAX_CIRCUITS } from './constants';
import { fail } from './failures';
import type {
  ConductorData,
  Failure,
  GroundWirePosition,
  OverheadSection,
  PhasePosition,
  Where,
} from './types';

type Position = PhasePosition | GroundWirePosition;

/** Outer limits of what can be meant at all; the filing's schema is narrower. */
const MAX_LENGTH_M = 1e5;
/** Metals have 1e−8 Ω·m; far below that the earth is the ideal plane of a limit test. */
const MIN_RESISTIVITY = 1e-20;
const MAX_RESISTIVITY = 1e9;
/** Below this a measure is a slip of the keyboard, and its logarithm or reciprocal would run away. */
const TINY = 1e-9;

/** A number that is missing, not finite or outside [low, high] (low itself excluded when `open`). */
function badNumber(
  value: unknown,
  low: number,
  high: number,
  open: boolean,
  where: Where,
  field: string,
): Failure | null {
  // NaN fails both comparisons, so the quick exit is only taken by real numbers in range.
  if (typeof value === 'number' && value <= high && (open ? value > low : value >= low)) return null;
  const place = { ...where, field };
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return fail('non-finite', place, `${field} is ${String(value)}, a finite number is wanted`);
  }
  return fail(
    'out-of-range',
    place,
    `${field} is ${value}, wanted is a value ${open ? 'above' : 'from'} ${low} up to ${high}`,
  );
}

/**
 * Checks a frequency against the range that the engine answers for.
 *
 * @param frequencyHz frequency in Hz
 * @returns the failure, or null when it is in range
 */
export function checkFrequency(frequencyHz: number): Failure | null {
  return badNumber(frequencyHz, FREQUENCY_RANGE_HZ[0], FREQUENCY_RANGE_HZ[1], false, {}, 'frequencyHz');
}

/** A required field of the conductor's model: absent is a fault of the data, not of the number. */
function requiredField(
  c: ConductorData,
  field: keyof ConductorData,
  low: number,
  where: Where,
): Failure | null {
  const value = c[field];
  // A gap in the data and a wrong number want different answers from whoever fills in the form.
  if (value === undefined || value === null) {
    return fail('conductor-data', { ...where, field }, `a ${c.model} conductor needs ${field}`);
  }
  return badNumber(value, low, 1e6, true, where, field);
}

/** Temperature and its coefficient, where given: in range, and leaving a resistance above zero. */
function checkTemperature(c: ConductorData, where: Where): Failure | null {
  const { temperatureC, temperatureCoefficientPerK: alpha } = c;
  const fault =
    (temperatureC === undefined
      ? null
      : badNumber(temperatureC, -273.15, 2000, true, where, 'temperatureC')) ??
    (alpha === undefined ? null : badNumber(alpha, 0, 1, false, where, 'temperatureCoefficientPerK'));
  if (fault) return fault;
  if (temperatureC === undefined || resistanceGrowth(c, temperatureC) > 0) return null;
  return fail(
    'conductor-data',
    { ...where, field: 'temperatureC' },
    `at ${temperatureC} °C the resistance would not be positive any more`,
  );
}

/** Data that the model `tube` needs; a core as wide as the wire leaves no metal to carry current. */
function checkTube(c: ConductorData, where: Where): Failure | null {
  const { coreDiameterMm = 0, diameterMm } = c;
  const fault =
    requiredField(c, 'dcResistance20OhmPerKm', TINY, where) ??
    requiredField(c, 'temperatureC', -273.15, where) ??
    checkTemperature(c, where) ??
    badNumber(coreDiameterMm, 0, 1e4, false, where, 'coreDiameterMm');
  if (fault || coreDiameterMm < diameterMm) return fault;
  return fail(
    'conductor-data',
    { ...where, field: 'coreDiameterMm' },
    `the core (${coreDiameterMm} mm) is as wide as the conductor (${diameterMm} mm)`,
  );
}

/** A conductor's data against what its model needs; data that the model does not use are not looked at. */
function checkConductor(c: ConductorData | undefined, where: Where): Failure | null {
  if (c === undefined || c === null || typeof c !== 'object') {
    return fail('conductor-data', { ...where, field: 'conductor' }, 'the position names no conductor');
  }
  const diameter = badNumber(c.diameterMm, TINY, 1e4, true, where, 'diameterMm');
  if (diameter) return diameter;
  if (c.model === 'handbook') {
    return (
      requiredField(c, 'acResistanceOhmPerKm', 0, where) ??
      requiredField(c, 'gmrMm', TINY, where) ??
      checkTemperature(c, where)
    );
  }
  if (c.model === 'tube') return checkTube(c, where);
  return fail(
    'conductor-data',
    { ...where, field: 'model' },
    `model is ${String(c.model)}, wanted is handbook or tube`,
  );
}

/** Bundle count and side; a side is wanted from two subconductors on. */
function checkBundle(p: PhasePosition, where: Where): Failure | null {
  if (!Number.isInteger(p.bundleCount) || p.bundleCount < 1 || p.bundleCount > MAX_BUNDLE) {
    return Number.isFinite(p.bundleCount)
      ? fail(
          'out-of-range',
          { ...where, field: 'bundleCount' },
          `bundleCount is ${p.bundleCount}, wanted is 1 to ${MAX_BUNDLE}`,
        )
      : badNumber(p.bundleCount, 1, MAX_BUNDLE, false, where, 'bundleCount');
  }
  return p.bundleCount === 1 ? null : badNumber(p.bundleSpacingM, TINY, 100, true, where, 'bundleSpacingM');
}

/** Circumradius of the bundle's polygon, m: how far below its centre a subconductor may hang. */
function bundleRadius(p: Position): number {
  return p.kind === 'phase' && p.bundleCount > 1
    ? p.bundleSpacingM / (2 * Math.sin(Math.PI / p.bundleCount))
    : 0;
}

/** Numbers, conductor and bundle of one position, and that its lowest point clears the ground. */
function checkPosition(p: Position, where: Where): Failure | null {
  const fault =
    badNumber(p.horizontalM, -MAX_LENGTH_M, MAX_LENGTH_M, false, where, 'horizontalM') ??
    badNumber(p.attachmentHeightM, -MAX_LENGTH_M, MAX_LENGTH_M, false, where, 'attachmentHeightM') ??
    badNumber(p.sagM, 0, MAX_LENGTH_M, false, where, 'sagM') ??
    checkConductor(p.conductor, where) ??
    (p.kind === 'phase' ? checkBundle(p, where) : null);
  if (fault) return fault;
  // The sag counts in full here: the wire's lowest point, not its average, must hang above the ground.
  const lowest = p.attachmentHeightM - p.sagM - bundleRadius(p) - p.conductor.diameterMm / 2000;
  if (lowest > 0) return null;
  return fail(
    'wire-in-ground',
    { ...where, field: p.attachmentHeightM > 0 ? 'sagM' : 'attachmentHeightM' },
    `the lowest point hangs at ${lowest.toFixed(2)} m, wanted is a wire above the ground`,
  );
}

/** Order of the phases within a circuit's three rows. */
const PHASE_INDEX = { a: 0, b: 1, c: 2 } as const;

/**
 * Slot of a phase in the matrices: circuit 1 a b c, circuit 2 a b c …
 *
 * @returns index from 0, or −1 when circuit or phase is not one
 */
export function phaseSlot(p: PhasePosition): number {
  const phase = PHASE_INDEX[p.phase];
  if (phase === undefined || !Number.isInteger(p.circuit) || p.circuit < 1 || p.circuit > MAX_CIRCUITS)
    return -1;
  return (p.circuit - 1) * 3 + phase;
}

/** Every circuit from 1 to the highest has its phases a, b, c exactly once. */
function checkPhases(positions: readonly Position[]): Failure | null {
  // Position by slot, −1 for none: finds both a phase that comes twice and one that is missing.
  const seen = new Int32Array(3 * MAX_CIRCUITS).fill(-1);
  let slots = 0;
  for (let i = 0; i < positions.length; i++) {
    const p = positions[i] as Position;
    if (p.kind !== 'phase') continue;
    const slot = phaseSlot(p);
    if (slot < 0) {
      return fail(
        'out-of-range',
        { position: i, field: 'circuit' },
        `circuit ${p.circuit} phase ${String(p.phase)}, wanted are circuits 1 to ${MAX_CIRCUITS} and phases a, b, c`,
      );
    }
    const first = seen[slot] as number;
    if (first >= 0) {
      return fail(
        'duplicate-phase',
        { position: i, other: first },
        `circuit ${p.circuit} has phase ${p.phase} twice`,
      );
    }
    seen[slot] = i;
    slots = Math.max(slots, 3 * p.circuit);
  }
  if (slots === 0) return fail('empty-section', {}, 'the section has no phase conductor');
  for (let slot = 0; slot < slots; slot++) {
    if ((seen[slot] as number) < 0) {
      const name = 'abc'.charAt(slot % 3);
      return fail(
        'missing-phase',
        { field: 'positions' },
        `circuit ${Math.floor(slot / 3) + 1} has no phase ${name}`,
      );
    }
  }
  return null;
}

/**
 * Checks all that can be said about an overhead section without computing: numbers, ranges, conductors, phases.
 *
 * @param s the section
 * @returns the first failure (positions in their order), or null
 */
export function checkSection(s: OverheadSection): Failure | null {
  if (s === null || typeof s !== 'object') return fail('empty-section', {}, 'there is no section');
  const earth =
    badNumber(s.lengthKm, TINY, 1e5, true, {}, 'lengthKm') ??
    badNumber(s.earthResistivityOhmM, MIN_RESISTIVITY, MAX_RESISTIVITY, true, {}, 'earthResistivityOhmM');
  if (earth) return earth;
  if (!Array.isArray(s.positions) || s.positions.length === 0) {
    return fail('empty-section', {}, 'the section has no positions');
  }
  for (let i = 0; i < s.positions.length; i++) {
    const p = s.positions[i] as Position;
    if (p === null || typeof p !== 'object' || (p.kind !== 'phase' && p.kind !== 'ground-wire')) {
      return fail('empty-section', { position: i }, 'the position is neither a phase nor a ground wire');
    }
    const fault = checkPosition(p, { position: i });
    if (fault) return fault;
  }
  return checkPhases(s.positions);
}
