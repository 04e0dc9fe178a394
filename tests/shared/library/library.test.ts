import { describe, expect, it } from 'vitest';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import { acResistanceAt, handbookData, handbookLacks, isChoosable } from '#shared/library/handbook-data';
import type { LibraryConductor } from '#shared/library/types';

const rows = STARTING_LIBRARY.conductors;
function row(name: string): LibraryConductor {
  const found = rows.find((r) => r.name === name);
  if (!found) throw new Error(`no conductor ${name}`);
  return found;
}

describe('the starting library', () => {
  it('names each conductor once, with source and tag', () => {
    expect(rows).toHaveLength(128);
    expect(new Set(rows.map((r) => r.name)).size).toBe(128);
    expect(rows.filter((r) => r.source.length < 10 || !['T', 'C', 'M', 'T+C'].includes(r.tag))).toEqual([]);
  });

  it('holds what the published tables print (Drake: catalogue table, T)', () => {
    expect(handbookData(row('Drake'), 50)).toEqual({
      name: 'Drake',
      model: 'handbook',
      diameterMm: 28.12,
      coreDiameterMm: 10.363,
      gmrMm: 11.36,
      acResistanceOhmPerKm: 0.0794,
      dcResistance20OhmPerKm: 0.07021,
      temperatureC: 50,
      temperatureCoefficientPerK: 0.00403,
    });
    // IEEE PES distribution test feeders (T): 336,400 26/7, GMR 0.0244 ft, 0.306 Ω/mile, 0.721 in.
    const feeder = row('336,400 26/7 (Kersting App. A)');
    expect(feeder.gmrMm).toBeCloseTo(0.0244 * 304.8, 3);
    expect(acResistanceAt(feeder, 50)).toBeCloseTo(0.306 / 1.609344, 5);
    expect(feeder.diameterMm).toBeCloseTo(0.721 * 25.4, 2);
  });

  it('does not take the misprinted reactance of Merlin for its GMR', () => {
    expect(row('Merlin').gmrMm).toBe(6.74);
  });

  it('lets nobody choose a row that lacks what the model needs', () => {
    expect(handbookLacks(row('Teal'))).toEqual(['an a.c. resistance']);
    expect(handbookLacks(row('15-AL1/3-ST1A'))).toEqual(['an a.c. resistance', 'a GMR']);
    expect(isChoosable(row('Tulip'))).toBe(false);
    expect(handbookData(row('OPGW typical small'), 20)).toBeNull();
    expect(rows.filter(isChoosable).length).toBe(102);
  });

  it('has common ground wires to choose from', () => {
    const wires = rows.filter((r) => r.family === 'shield wire' && isChoosable(r)).map((r) => r.name);
    expect(wires).toEqual([
      '3/8 in EHS 7-strand steel',
      '7/16 in EHS 7-strand steel',
      '7 No.8 Alumoweld',
      '7 No.6 Alumoweld',
    ]);
    // Steel’s resistance rises with current more than with temperature: it is held.
    expect(acResistanceAt(row('3/8 in EHS 7-strand steel'), 75)).toBe(4);
  });

  it('contradicts itself nowhere: GMR below radius, a.c. above d.c., resistance rising with temperature', () => {
    for (const r of rows) {
      if (r.gmrMm !== undefined) expect(r.gmrMm, r.name).toBeLessThan(r.diameterMm / 2);
      if ((r.coreDiameterMm ?? 0) > 0) expect(r.coreDiameterMm, r.name).toBeLessThan(r.diameterMm);
      const ac = r.acResistances ?? [];
      ac.slice(1).forEach((a, i) => expect(a.ohmPerKm, r.name).toBeGreaterThan(ac[i]?.ohmPerKm ?? Infinity));
      if (r.dcResistance20OhmPerKm && ac[0])
        expect(ac[0].ohmPerKm, r.name).toBeGreaterThan(r.dcResistance20OhmPerKm);
    }
  });

  it('takes GMRs that lie where layers of strands have them, 0.75 to 0.84 of the radius (common practice, no source)', () => {
    const layered = rows.filter(
      (r) => r.family.startsWith('ACSR (ASTM') && r.gmrMm && r.gmrFrom !== 'tabled-xa',
    );
    expect(layered.length).toBeGreaterThan(20);
    for (const r of layered) expect((r.gmrMm ?? 0) / (r.diameterMm / 2), r.name).toBeGreaterThan(0.75);
    for (const r of layered) expect((r.gmrMm ?? 0) / (r.diameterMm / 2), r.name).toBeLessThan(0.84);
  });
});

describe('resistance at a temperature', () => {
  it('is the tabled one, or between two of them on a straight line', () => {
    expect(acResistanceAt(row('Drake'), 25)).toBe(0.07283);
    expect(acResistanceAt(row('Drake'), 75)).toBe(0.08629);
    expect(acResistanceAt(row('Drake'), 60)).toBeCloseTo(0.0794 + (10 / 25) * (0.08629 - 0.0794), 7);
  });

  it('goes on by the coefficient of aluminium beyond the table', () => {
    const beyond = acResistanceAt(row('Drake'), 100) ?? NaN;
    expect(beyond).toBeCloseTo((0.08629 * (1 + 0.00403 * 80)) / (1 + 0.00403 * 55), 7);
    // A row with one temperature only reaches the others the same way.
    const one = acResistanceAt(row('Brant'), 25) ?? NaN;
    expect(one).toBeCloseTo((0.17257 * (1 + 0.00403 * 5)) / (1 + 0.00403 * 55), 7);
  });
});
