import { describe, expect, it } from 'vitest';
import type { Band } from '#shared/contracts/api.generated';
import {
  applyEdit,
  bandKey,
  bandsOf,
  changedBands,
  classesOf,
  editedBands,
  limitText,
  readLimit,
} from '../../../../src/features/bands/model/band-form';

const band = (over: Partial<Band> = {}): Band => ({
  classKv: 230,
  frequencyHz: 60,
  parameter: 'x1',
  typical: [0.32, 0.54],
  outer: [0.26, 0.62],
  source: 'public data',
  ...over,
});

describe('a band as fields', () => {
  it('shows what is kept and reads what is typed, wave speed in per cent', () => {
    expect(limitText(0.32, 'x1')).toBe('0.32');
    expect(limitText(0.965, 'waveSpeed')).toBe('96.5');
    expect(readLimit('96.5', 'waveSpeed')).toBe(0.965);
    expect(readLimit(' \u22120.5 ', 'x1')).toBe(-0.5);
    expect(['', '0,33', '1e999', 'abc', '0x10', '.5'].map((t) => readLimit(t, 'x1'))).toEqual(
      Array(6).fill(null),
    );
  });

  it('takes a changed limit and keeps the others', () => {
    const { band: next, fault } = applyEdit(band(), { typicalLow: '0.33', source: 'fleet since 2021' });
    expect(fault).toBeNull();
    expect(next).toMatchObject({ typical: [0.33, 0.54], outer: [0.26, 0.62], source: 'fleet since 2021' });
  });

  it.each([
    [{ typicalLow: '0.6' }, ['typicalLow', 'typicalHigh']],
    [{ typicalLow: '0.54' }, ['typicalLow', 'typicalHigh']],
    [{ outerLow: '0.4' }, ['outerLow', 'typicalLow']],
    [{ outerHigh: '0.5' }, ['typicalHigh', 'outerHigh']],
    [{ outerHigh: 'wide' }, ['outerHigh']],
  ] as const)('refuses limits out of order or unreadable: %j', (edit, limits) => {
    expect(applyEdit(band(), edit).fault?.limits).toEqual(limits);
    expect(editedBands([band()], { [bandKey(band())]: edit })).toBeNull();
  });

  it('takes limits that touch', () => {
    expect(applyEdit(band(), { outerLow: '0.32', outerHigh: '0.54' }).fault).toBeNull();
  });

  it('knows what differs from the bands in force', () => {
    const inForce = [band(), band({ parameter: 'b1' })];
    const draft = [band({ typical: [0.33, 0.54] }), band({ parameter: 'b1', source: 'other words' })];
    expect(changedBands(draft, inForce).map((b) => b.parameter)).toEqual(['x1']);
  });

  it('lists classes, and the parameters of one in the order of the trade', () => {
    const all = [band({ classKv: 345 }), band({ parameter: 'waveSpeed' }), band({ parameter: 'r1' }), band()];
    expect(classesOf(all).map((c) => c.classKv)).toEqual([230, 345]);
    expect(bandsOf(all, 230, 60).map((b) => b.parameter)).toEqual(['r1', 'x1', 'waveSpeed']);
    expect(bandsOf(all, 230, 50)).toEqual([]);
  });
});
