import { describe, expect, it } from 'vitest';
import {
  DEFAULT_INPUT_UNCERTAINTIES,
  handCheck,
  phaseCascade,
  sectionMatrices,
  sensitivities,
  solveLine,
  solveSection,
  sweep,
  uncertainty,
  type Failure,
  type OverheadSection,
} from '#shared/engine/index';
import { failure, good, TUBE, withConductor, withPosition } from './bad-sections';

const cases: [string, OverheadSection, Failure['reason'], Failure['where']][] = [
  [
    'two phases at one place',
    withPosition(1, { ...good.positions[0], phase: 'b' }),
    'coincident-wires',
    { position: 1, other: 0 },
  ],
  [
    'a ground wire on another',
    withPosition(4, { ...good.positions[3] }),
    'coincident-wires',
    { position: 4, other: 3 },
  ],
  [
    'two ground wires that touch',
    withPosition(4, { ...good.positions[3], horizontalM: (good.positions[3]?.horizontalM ?? 0) + 0.005 }),
    'overlapping-wires',
    { position: 4, other: 3 },
  ],
  [
    'a bundle narrower than its conductors',
    withPosition(0, { bundleSpacingM: 0.02 }),
    'overlapping-wires',
    { position: 0, field: 'bundleSpacingM' },
  ],
  ['sag into the ground', withPosition(2, { sagM: 60 }), 'wire-in-ground', { position: 2, field: 'sagM' }],
  [
    'attachment below ground',
    withPosition(2, { attachmentHeightM: -3, sagM: 0 }),
    'wire-in-ground',
    { position: 2, field: 'attachmentHeightM' },
  ],
  [
    'height not a number',
    withPosition(1, { attachmentHeightM: NaN }),
    'non-finite',
    { position: 1, field: 'attachmentHeightM' },
  ],
  [
    'offset infinite',
    withPosition(1, { horizontalM: Infinity }),
    'non-finite',
    { position: 1, field: 'horizontalM' },
  ],
  [
    'offset a text',
    withPosition(1, { horizontalM: '3' }),
    'non-finite',
    { position: 1, field: 'horizontalM' },
  ],
  ['negative sag', withPosition(1, { sagM: -1 }), 'out-of-range', { position: 1, field: 'sagM' }],
  [
    'no conductor',
    withPosition(1, { conductor: undefined }),
    'conductor-data',
    { position: 1, field: 'conductor' },
  ],
  ['unknown model', withConductor(1, { model: 'rope' }), 'conductor-data', { position: 1, field: 'model' }],
  [
    'handbook without GMR',
    withConductor(1, { gmrMm: undefined }),
    'conductor-data',
    { position: 1, field: 'gmrMm' },
  ],
  [
    'handbook without resistance',
    withConductor(1, { acResistanceOhmPerKm: undefined }),
    'conductor-data',
    { position: 1, field: 'acResistanceOhmPerKm' },
  ],
  [
    'negative resistance',
    withConductor(1, { acResistanceOhmPerKm: -1 }),
    'out-of-range',
    { position: 1, field: 'acResistanceOhmPerKm' },
  ],
  ['diameter 0', withConductor(1, { diameterMm: 0 }), 'out-of-range', { position: 1, field: 'diameterMm' }],
  [
    'tube without temperature',
    withConductor(1, { ...TUBE, temperatureC: undefined }),
    'conductor-data',
    { position: 1, field: 'temperatureC' },
  ],
  [
    'core as wide as the tube',
    withConductor(1, { ...TUBE, coreDiameterMm: 28 }),
    'conductor-data',
    { position: 1, field: 'coreDiameterMm' },
  ],
  [
    'colder than any resistance',
    withConductor(1, { ...TUBE, temperatureC: -270 }),
    'conductor-data',
    { position: 1, field: 'temperatureC' },
  ],
  [
    'nine subconductors',
    withPosition(0, { bundleCount: 9 }),
    'out-of-range',
    { position: 0, field: 'bundleCount' },
  ],
  [
    'half a subconductor',
    withPosition(0, { bundleCount: 1.5 }),
    'out-of-range',
    { position: 0, field: 'bundleCount' },
  ],
  [
    'bundle without side',
    withPosition(0, { bundleSpacingM: 0 }),
    'out-of-range',
    { position: 0, field: 'bundleSpacingM' },
  ],
  ['phase a twice', withPosition(1, { phase: 'a' }), 'duplicate-phase', { position: 1, other: 0 }],
  ['phase d', withPosition(1, { phase: 'd' }), 'out-of-range', { position: 1, field: 'circuit' }],
  ['circuit 0', withPosition(1, { circuit: 0 }), 'out-of-range', { position: 1, field: 'circuit' }],
  ['circuit 7', withPosition(1, { circuit: 7 }), 'out-of-range', { position: 1, field: 'circuit' }],
  ['phase b missing', { ...good, positions: good.positions.filter((_, i) => i !== 1) }, 'missing-phase', {}],
  [
    'circuit 1 missing',
    { ...good, positions: good.positions.map((p) => (p.kind === 'phase' ? { ...p, circuit: 2 } : p)) },
    'missing-phase',
    {},
  ],
  ['no positions', { ...good, positions: [] }, 'empty-section', {}],
  [
    'ground wires only',
    { ...good, positions: good.positions.filter((p) => p.kind === 'ground-wire') },
    'empty-section',
    {},
  ],
  [
    'soil of resistivity 0',
    { ...good, earthResistivityOhmM: 0 },
    'out-of-range',
    { field: 'earthResistivityOhmM' },
  ],
  ['soil unknown', { ...good, earthResistivityOhmM: NaN }, 'non-finite', { field: 'earthResistivityOhmM' }],
  ['length 0', { ...good, lengthKm: 0 }, 'out-of-range', { field: 'lengthKm' }],
];

describe('bad sections are refused with reason and place', () => {
  it.each(cases)('%s', (_, section, reason, where) => {
    const seen = failure(solveSection(section, 60));
    expect(seen.reason).toBe(reason);
    expect(seen.where).toMatchObject(where);
    expect(seen.detail.length).toBeGreaterThan(10);
    // Every other door says the same.
    for (const result of [
      sectionMatrices(section, 60),
      sweep(section, [50, 60]),
      handCheck(section, 60, 1),
      sensitivities(section, 60),
    ]) {
      expect(failure(result).reason).toBe(reason);
    }
    const line = { frequencyHz: 60, sections: [good, section] };
    for (const result of [
      solveLine(line),
      uncertainty(line, DEFAULT_INPUT_UNCERTAINTIES),
      phaseCascade(line),
    ]) {
      expect(failure(result).where.section).toBe(1);
      expect(failure(result).reason).toBe(reason);
    }
  });

  it('the good section is good', () => {
    expect(solveSection(good, 60).ok).toBe(true);
  });
});
