import { describe, expect, it } from 'vitest';
import type { Conductor } from '#shared/contracts/api.generated';
import { offeredFor } from '../../../../src/features/line-form/model/conductor-groups';

const conductor = (name: string, family: string, more: Partial<Conductor> = {}): Conductor =>
  ({ name, row: { name, family }, choosable: true, retired: false, ...more }) as unknown as Conductor;

const LIST = [
  conductor('Steel 3/8', 'shield wire'),
  conductor('Alpha', 'stranded aluminium'),
  conductor('Beta', 'steel-cored'),
  conductor('Gamma', 'steel-cored', { choosable: false }),
  conductor('Optical', 'shield wire', { choosable: false }),
  conductor('Old', 'steel-cored', { choosable: false, retired: true }),
];

const outline = (use: 'phase' | 'ground', current = '') =>
  offeredFor(use, LIST, current).map((g) => [g.label, g.closed, g.items.map((c) => c.name)]);

describe('the list of conductors', () => {
  it('offers phase conductors by family, then ground wires, and closes what lacks data', () => {
    expect(outline('phase')).toEqual([
      ['Phase conductors: stranded aluminium', false, ['Alpha']],
      ['Phase conductors: steel-cored', false, ['Beta']],
      ['Ground wires', false, ['Steel 3/8']],
      ['Data missing here: take “Own data sheet”', true, ['Gamma', 'Optical']],
    ]);
  });

  it('begins with the ground wires where one is asked for', () => {
    expect(outline('ground').map(([label]) => label)[0]).toBe('Ground wires');
  });

  it('keeps what is chosen, though it was retired or lacks data', () => {
    expect(outline('phase', 'Old')[1]).toEqual(['Phase conductors: steel-cored', false, ['Beta', 'Old']]);
    expect(outline('phase', 'Gamma')[1]).toEqual(['Phase conductors: steel-cored', false, ['Beta', 'Gamma']]);
  });
});
