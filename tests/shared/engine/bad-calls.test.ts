import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ampacity,
  circuitAmpacity,
  DEFAULT_INPUT_UNCERTAINTIES,
  handCheck,
  impliedGeometry,
  phaseCascade,
  sectionMatrices,
  solveLine,
  solveSection,
  sweep,
  uncertainty,
  type CableSection,
  type OverheadSection,
  type PhasePosition,
  type Result,
} from '#shared/engine/index';
import { eliminateComplex, eliminateReal, invertReal } from '#shared/numerics/packed';
import { failure, good, TUBE, withConductor, withPosition } from './bad-sections';
import { buildLine } from './random-lines';

describe('bad lines and calls', () => {
  it.each([0, -50, 0.05, 2e6, NaN, Infinity])('frequency %f Hz', (f) => {
    expect(failure(solveSection(good, f)).where.field).toBe('frequencyHz');
    expect(failure(solveLine({ frequencyHz: f, sections: [good] })).where.field).toBe('frequencyHz');
    expect(failure(solveLine({ frequencyHz: 60, sections: [good] }, f)).where.field).toBe('frequencyHz');
    expect(failure(sweep(good, [60, f])).where.field).toBe('frequencyHz');
  });

  it('no section, or none to speak of', () => {
    expect(failure(solveLine({ frequencyHz: 60, sections: [] })).reason).toBe('empty-line');
    expect(failure(solveLine(null as never)).reason).toBe('empty-line');
    expect(failure(solveLine({ frequencyHz: 60, sections: [null as never] })).reason).toBe('empty-section');
    expect(failure(solveSection(undefined as never, 60)).reason).toBe('empty-section');
  });

  it('sections with different numbers of circuits', () => {
    const double = buildLine({
      circuits: 2,
      bundleCount: 1,
      groundWires: 1,
      tube: false,
      segmented: false,
      spacing: 0.5,
      height: 0.5,
      sag: 0.5,
      diameter: 0.5,
      resistivity: 0.5,
      skew: 0.5,
    });
    const line = { frequencyHz: 60, sections: [good, double] };
    for (const result of [
      solveLine(line),
      uncertainty(line, DEFAULT_INPUT_UNCERTAINTIES),
      phaseCascade(line),
    ]) {
      expect(failure(result)).toMatchObject({ reason: 'circuit-mismatch', where: { section: 1 } });
    }
  });

  it('cables without values, with holes, without length', () => {
    const value = { r1: 0.02, x1: 0.2, b1: 80, r0: 0.1, x0: 0.1, b0: 80 };
    const solve = (s: Partial<CableSection>) =>
      failure(
        solveLine({ frequencyHz: 60, sections: [{ kind: 'cable', lengthKm: 2, perLength: [value], ...s }] }),
      );
    expect(solve({ perLength: [] }).reason).toBe('empty-section');
    expect(solve({ perLength: [{ ...value, b0: NaN }] })).toMatchObject({
      reason: 'non-finite',
      where: { section: 0, field: 'b0' },
    });
    expect(solve({ lengthKm: -1 }).reason).toBe('out-of-range');
  });

  it('a cable of no impedance at all still gives numbers', () => {
    const perLength = [{ r1: 0, x1: 0, b1: 80, r0: 0, x0: 0, b0: 80 }];
    const result = solveLine({ frequencyHz: 60, sections: [{ kind: 'cable', lengthKm: 2, perLength }] });
    if (!result.ok) throw new Error(result.detail);
    expect(result.value.equivalent[0]).toMatchObject({ r: 0, x: 0, b: 160 });
  });

  it('uncertainties that are none', () => {
    const line = { frequencyHz: 60, sections: [good] };
    for (const [field, value] of [
      ['heightM', -1],
      ['earthResistivityFactor', 0.5],
      ['gmrRelative', NaN],
    ] as const) {
      const result = uncertainty(line, { ...DEFAULT_INPUT_UNCERTAINTIES, [field]: value });
      expect(failure(result)).toMatchObject({ reason: 'out-of-range', where: { field } });
    }
  });

  it('ratings: weather missing or absurd, circuit not there', () => {
    const input = { diameterMm: 28, resistanceOhmPerKm: 0.09, conductorTemperatureC: 75 };
    expect(failure(ampacity({ ...input, weather: undefined as never })).where.field).toBe('weather');
    const weather = {
      airTemperatureC: 40,
      windSpeedMPerS: -1,
      windAngleDeg: 90,
      emissivity: 0.8,
      absorptivity: 0.8,
      elevationM: 0,
      latitudeDeg: 30,
      lineAzimuthDeg: 90,
      dayOfYear: 161,
      solarHour: 11,
      atmosphere: 'clear' as const,
    };
    expect(failure(ampacity({ ...input, weather }))).toMatchObject({
      reason: 'out-of-range',
      where: { field: 'windSpeedMPerS' },
    });
    expect(failure(circuitAmpacity(good, 3, 75, { ...weather, windSpeedMPerS: 1 }, 60)).reason).toBe(
      'missing-phase',
    );
    expect(failure(handCheck(good, 60, 2)).reason).toBe('missing-phase');
  });

  it('declared values that no geometry gives', () => {
    const base = { frequencyHz: 60, diameterMm: 28, bundleCount: 1, bundleSpacingM: 0 };
    expect(impliedGeometry({ ...base, x1: 0.4, b1: 0 })).toBeNull();
    expect(impliedGeometry({ ...base, x1: NaN, b1: 4 })).toBeNull();
  });
});

describe('singular and ill-conditioned matrices say so', () => {
  it('elimination of a singular matrix has an infinite condition', () => {
    const twice = Float64Array.from([1, 1, 1]);
    expect(eliminateReal(twice.slice(), 2, 0)).toBe(Infinity);
    expect(invertReal(twice.slice(), 2)).toBe(Infinity);
    expect(eliminateComplex(twice.slice(), new Float64Array(3), 2, 0)).toBe(Infinity);
  });

  it('a nearly singular one a large one', () => {
    const near = Float64Array.from([1, 1, 1 + 1e-13]);
    expect(eliminateComplex(near, new Float64Array(3), 2, 0)).toBeGreaterThan(1e12);
  });

  it('a bundle whose own and mutual flux are equal, and which has no resistance, shares its current arbitrarily', () => {
    // Deep in the earth both return alike, so a GMR equal to the side leaves no flux between the two.
    const { bundleSpacingM } = good.positions[0] as PhasePosition;
    const tuned = withConductor(0, { gmrMm: 1000 * bundleSpacingM, acResistanceOhmPerKm: 1e-15 });
    // Nothing else that is eliminated may couple into that loop.
    const [a, b, c] = tuned.positions as [PhasePosition, PhasePosition, PhasePosition];
    const positions = [a, { ...b, bundleCount: 1 }, { ...c, bundleCount: 1 }];
    const seen = failure(solveSection({ ...tuned, positions, earthResistivityOhmM: 1e9 }, 0.1));
    expect(seen.reason).toBe('ill-conditioned');
    expect(seen.condition).toBeGreaterThan(1e10);
  });
});

describe('whatever comes in, no exception and no NaN comes out', () => {
  const odd = fc.oneof(
    fc.constantFrom(0, -0, NaN, Infinity, -Infinity, 1e308, -1e308, 1e-308, 5, 0.5, -3),
    fc.double(),
    fc.constantFrom(null, undefined, '', 'x', {}, []),
  );
  const fields = [
    'horizontalM',
    'attachmentHeightM',
    'sagM',
    'bundleCount',
    'bundleSpacingM',
    'circuit',
    'phase',
    'conductor',
    'kind',
  ];
  const conductorFields = [
    'diameterMm',
    'gmrMm',
    'acResistanceOhmPerKm',
    'dcResistance20OhmPerKm',
    'coreDiameterMm',
    'temperatureC',
    'temperatureCoefficientPerK',
    'model',
  ];

  /** NaN or infinity anywhere in a plain value. */
  function hasHole(value: unknown): boolean {
    if (typeof value === 'number') return !Number.isFinite(value);
    if (value !== null && typeof value === 'object') return Object.values(value).some(hasHole);
    return false;
  }

  function answersFor(section: OverheadSection, frequencyHz: number): Result<unknown>[] {
    const line = { frequencyHz: 60, sections: [section] };
    return [
      solveSection(section, frequencyHz),
      solveLine(line, frequencyHz),
      uncertainty(line, DEFAULT_INPUT_UNCERTAINTIES),
      sectionMatrices(section, frequencyHz),
      handCheck(section, 60, 1),
      sweep(section, [50, 1e5], true),
    ];
  }

  it('with any field of a position or conductor replaced by anything', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 4 }),
        fc.constantFrom(...fields),
        fc.constantFrom(...conductorFields),
        odd,
        fc.boolean(),
        fc.boolean(),
        (index, field, conductorField, value, inConductor, tube) => {
          const section = inConductor
            ? withConductor(index, { ...(tube ? TUBE : {}), [conductorField]: value })
            : withPosition(index, { [field]: value });
          for (const result of answersFor(section, 60)) {
            if (result.ok) expect(hasHole(result.value)).toBe(false);
            else expect(result.reason.length).toBeGreaterThan(3);
          }
        },
      ),
      { numRuns: 600, seed: 41 },
    );
  });

  it('with any soil and any frequency', () => {
    fc.assert(
      fc.property(odd, odd, (soil, frequency) => {
        const section = { ...good, earthResistivityOhmM: soil as number };
        for (const result of answersFor(section, frequency as number)) {
          if (result.ok) expect(hasHole(result.value)).toBe(false);
        }
      }),
      { numRuns: 300, seed: 42 },
    );
  });
});
