import { describe, expect, it } from 'vitest';
import { lineDraftFaults, lineFaults } from '#shared/contracts/validators';
import { changed, example } from '../filing/sample';
import type { Line } from '../filing/sample';

const line = (change: (l: Line) => void = () => undefined): unknown => changed(change).lines[0];
const pointers = (faults: { pointer: string }[]) => faults.map((f) => f.pointer);

describe('a line that is still being written', () => {
  it.each<[string, unknown]>([
    ['nothing yet', {}],
    ['a name alone', { name: 'Harrow' }],
    ['an empty name', { name: '' }],
    ['a section without length', { sections: [{}] }],
    ['positions without conductors', { sections: [{ positions: [{ phase: 'a' }] }] }],
    ['a bundle without spacing', { sections: [{ positions: [{ bundleCount: 2 }] }] }],
    ['a conductor without data', { sections: [{ conductors: { phase: { model: 'tube' } } }] }],
    ['a length out of range', { sections: [{ lengthKm: 0 }] }],
    ['a value without unit', { declared: [{ circuit: 1, x1: { value: 0.4 } }] }],
    ['half a date', { declared: [{ basis: { date: '2027-0' } }] }],
    ['a cable with one value', { sections: [{ kind: 'cable', perLength: { r1: {} } }] }],
    ['a cable’s list', { sections: [{ kind: 'cable', perLength: [{ circuit: 1 }] }] }],
    ['the whole example', example().lines[0]],
  ])('may be %s', (_name, json) => {
    expect(lineDraftFaults(json)).toEqual([]);
  });

  it('holds by the same schema once it is whole, and not before', () => {
    expect(lineFaults(line())).toEqual([]);
    expect(pointers(lineFaults({ name: 'Harrow' }))).toEqual([
      '/declared',
      '/frequencyHz',
      '/from',
      '/nominalVoltageKv',
      '/sections',
      '/to',
    ]);
  });

  it.each<[string, unknown, string]>([
    ['text for a number', { nominalVoltageKv: '345' }, '/nominalVoltageKv'],
    ['an unknown key', { nominalVoltage: 345 }, '/nominalVoltage'],
    [
      'an unknown key below',
      { sections: [{ positions: [{ height: 3 }] }] },
      '/sections/0/positions/0/height',
    ],
    ['an unknown unit', { declared: [{ x1: { unit: 'ohms' } }] }, '/declared/0/x1/unit'],
    ['a number for text', { name: 5 }, '/name'],
    ['a name without end', { name: 'x'.repeat(121) }, '/name'],
    ['a name with NUL', { name: 'a\u0000' }, '/name'],
    ['too many sections', { sections: Array.from({ length: 101 }, () => ({})) }, '/sections'],
    ['a number that is not finite', { sections: [{ lengthKm: NaN }] }, '/sections/0/lengthKm'],
    ['no object at all', [], ''],
  ])('may not be %s', (_name, json, pointer) => {
    expect(pointers(lineDraftFaults(json))).toEqual([pointer]);
  });
});
