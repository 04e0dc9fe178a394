import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import { openForm } from '../../../../src/features/line-form/model/from-line';
import { readForm } from '../../../../src/features/line-form/model/to-line';
import { setAt } from '../../../../src/features/line-form/model/edit';

const phase = (p: string, x: number) => ({
  circuit: 1,
  phase: p,
  conductor: 'phase',
  horizontalM: x,
  attachmentHeightM: 24,
  sagM: 9,
  bundleCount: 2,
  bundleSpacingM: 0.4572,
});

/** A line with one of everything that the filing format knows, as an import would bring it. */
const LINE = {
  name: 'Harrow Fell – Sarn',
  from: 'Harrow Fell',
  to: 'Sarn',
  nominalVoltageKv: 345,
  frequencyHz: 60,
  sections: [
    {
      kind: 'overhead',
      lengthKm: 42.5,
      earthResistivityOhmM: 100,
      groundWireBonding: 'segmented',
      conductors: {
        phase: { library: 'Drake', temperatureC: 50 },
        ground: {
          name: '3/8 in steel',
          model: 'handbook',
          diameterMm: 9.14,
          gmrMm: 1,
          acResistanceOhmPerKm: 4,
        },
      },
      positions: [
        phase('a', -9),
        phase('b', 0),
        phase('c', 9),
        { groundWire: true, conductor: 'ground', horizontalM: -6.5, attachmentHeightM: 30, sagM: 7 },
      ],
    },
    {
      kind: 'cable',
      lengthKm: 0.8,
      perLength: [
        {
          circuit: 1,
          r1: { value: 0.02, unit: 'ohm/km' },
          x1: { value: 0.2, unit: 'ohm/km' },
          b1: { value: 80, unit: 'uS/km' },
          r0: { value: 0.1, unit: 'ohm/km' },
          x0: { value: 0.1, unit: 'ohm/km' },
          b0: { value: 80, unit: 'uS/km' },
        },
      ],
    },
  ],
  declared: [
    {
      circuit: 1,
      circuitId: 'HS-1',
      r1: { value: 0.0404, unit: 'ohm/km' },
      x1: { value: 0.6135, unit: 'ohm/mi' },
      b1: { value: 0.04, unit: 'pu', baseMva: 100, baseKv: 345 },
      ratingA: 1800,
      maxTemperatureC: 75,
      ratings: [{ season: 'summer', continuousA: 1700, emergencyA: 1900 }],
      basis: { kind: 'calculated', status: 'design', engineer: 'R. Aske', date: '2027-02-01' },
    },
  ],
};

describe('form and filing', () => {
  it('opens a line and gives the same line back', () => {
    expect(readForm(openForm(LINE)).line).toEqual(LINE);
  });

  it('gives a two-circuit line back, a circuit of somebody else without values', () => {
    const two = {
      ...LINE,
      sections: [
        {
          kind: 'overhead',
          lengthKm: 3,
          groundWireBonding: 'continuous',
          conductors: { phase: { library: 'Drake', temperatureC: 50 } },
          positions: [1, 2].flatMap((circuit) =>
            ['a', 'b', 'c'].map((p, i) => ({ ...phase(p, i * circuit), circuit })),
          ),
        },
      ],
      declaredMutual: [{ circuits: [1, 2], x0m: { value: 0.5, unit: 'ohm/km' } }],
    };
    const form = openForm(two);
    expect(form.circuits).toBe(2);
    expect(form.declared.map((d) => d.circuit)).toEqual([1]);
    expect(readForm(form).line).toEqual(two);
  });

  it('gives a section without geometry back without conductors and positions', () => {
    const bare = { ...LINE, sections: [{ kind: 'overhead', lengthKm: 5, groundWireBonding: 'continuous' }] };
    expect(openForm(bare).sections[0]?.hasGeometry).toBe(false);
    expect(readForm(openForm(bare)).line).toEqual(bare);
  });

  it('keeps texts as typed beside the number in the filing’s unit', () => {
    let form = openForm(LINE);
    form = setAt(form, ['sections', 0, 'positions', 0, 'attachmentHeightM'], { text: '78.7', unit: 'ft' });
    form = setAt(form, ['declared', 0, 'r1', 'text'], '0.0800');
    const reading = readForm(form);
    const height = (reading.line['sections'] as { positions: { attachmentHeightM: number }[] }[])[0]
      ?.positions[0]?.attachmentHeightM;
    expect(height).toBeCloseTo(78.7 * 0.3048, 10);
    expect(reading.asTyped).toEqual({
      '/sections/0/positions/0/attachmentHeightM': { text: '78.7', unit: 'ft' },
      '/declared/0/r1/value': { text: '0.0800' },
    });
    expect(openForm(reading.line, reading.asTyped)).toEqual(form);
  });

  it('forgets a kept text when another number has come in its place', () => {
    const asTyped = { '/sections/0/lengthKm': { text: '26.4', unit: 'mi' } };
    expect(openForm(LINE, asTyped).sections[0]?.lengthKm).toEqual({ text: '42.5', unit: 'km' });
  });

  it('leaves a text that is no number out of the line, keeps it, and says so at its place', () => {
    const form = setAt(openForm(LINE), ['declared', 0, 'x1', 'text'], '0,6135');
    const reading = readForm(form);
    expect((reading.line['declared'] as { x1: unknown }[])[0]?.x1).toEqual({ unit: 'ohm/mi' });
    expect(reading.faults).toEqual([
      {
        pointer: '/declared/0/x1/value',
        value: '0,6135',
        expected: '0.6135',
        message: 'Write the decimal sign as a point: 0.6135.',
      },
    ]);
    expect(openForm(reading.line, reading.asTyped)).toEqual(form);
  });

  it('survives a draft that holds next to nothing, or nonsense', () => {
    const form = openForm({ sections: [{ positions: 'x', lengthKm: 'long' }, null], declared: [7] });
    expect(form.sections).toHaveLength(2);
    expect(openForm(readForm(blankLine()).line)).toEqual(blankLine());
  });
});
