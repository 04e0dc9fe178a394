import { describe, expect, it } from 'vitest';
import {
  BRITISH_MEDIANS,
  BRITISH_ODDITIES,
  KUNDUR_TABLE,
  PLANNING_TABLE,
  STANDARD_TYPES,
  TEST_SYSTEM_BRANCH,
} from '../../golden/published-circuits';
import { bareLine, check, exampleLine, findings } from './example-line';
import type { Json } from './example-line';

/** Codes of what must be answered, save that the geometry is owed, which published tables never have. */
function answers(line: Json): string[] {
  return findings(check(line))
    .filter(({ grade, code }) => grade === 'must-answer' && code !== 'drawing.geometry-missing')
    .map(({ code }) => code);
}

const codes = (line: Json): string[] => findings(check(line)).map(({ code }) => code);

describe('published tables of typical values', () => {
  // Kundur, Power System Stability and Control, table 6.1 (M).
  it.each(KUNDUR_TABLE)('Kundur at %d kV needs no answer', (kv, r1, x1, b1) => {
    const line = bareLine(kv, 60, { r1, x1, b1 });
    expect(answers(line)).toEqual([]);
    expect(codes(line).includes('typical.no-class')).toBe(kv === 1100);
  });

  // Open table of standard line types, 50 Hz (T).
  it.each(
    STANDARD_TYPES.map(([kv, r1, x1, b1, isSuspect]) => ({ kv, r1, x1, b1, isSuspect: isSuspect === true })),
  )('standard type $kv kV, R1 $r1, X1 $x1, B1 $b1', ({ kv, isSuspect, ...declared }) => {
    const found = answers(bareLine(kv, 50, declared));
    if (isSuspect) expect(found).toContain('physics.wave-speed');
    else expect(found).toEqual([]);
  });

  // Line table of the Indian planning criteria, public digitisation (T).
  it.each(
    PLANNING_TABLE.map(([kv, name, r1, x1, b1, r0, x0, b0, isSuspect]) => ({
      kv,
      name,
      declared: { r1, x1, b1, r0, x0, b0 },
      isSuspect: isSuspect === true,
    })),
  )('planning table $kv kV $name', ({ kv, declared, isSuspect }) => {
    const line = bareLine(kv, 50, declared);
    const found = answers(line);
    if (isSuspect) expect(found).toContain('typical.r0-minus-r1');
    else expect(found).toEqual([]);
    expect(codes(line).includes('typical.no-class')).toBe(kv === 765 || kv === 66);
  });
});

describe('published circuit data without geometry', () => {
  // Circuit data of the transmission owners of Great Britain, 2024 (T data, C percentiles).
  it.each(BRITISH_MEDIANS)('a median circuit at %d kV asks nothing but its geometry', (kv, r1, x1, b1) => {
    const found = findings(check(bareLine(kv, 50, { r1, x1, b1 }))).filter(({ grade }) => grade !== 'note');
    expect(found.map(({ code }) => code)).toEqual(['drawing.geometry-missing']);
  });

  it.each(BRITISH_ODDITIES)(
    'a circuit at %d kV with a wave at %d of light’s must be answered',
    (kv, speed) => {
      const median = BRITISH_MEDIANS.find(([of]) => of === kv);
      if (median === undefined) throw new Error('no median at this voltage');
      const [, r1, x1] = median;
      // B1 such that X1 and B1 give the published speed: b = (ω/(v·c))²/x, in µS/km.
      const b1 = ((100 * Math.PI) / (speed * 299_792.458)) ** 2 / x1 / 1e-6;
      const found = answers(bareLine(kv, 50, { r1, x1, b1: Number(b1.toPrecision(5)) }));
      expect(found.some((code) => code === 'physics.wave-speed' || code.startsWith('typical.'))).toBe(true);
    },
  );

  // IEEE reliability test system, 1996 edition against the original of 1979 (T).
  it.each([
    ['misprintedX', true],
    ['originalX', false],
  ] as const)('branch 114-116 with its %s', (which, isCaught) => {
    const { kv, lengthMiles, r, b } = TEST_SYSTEM_BRANCH;
    const line = exampleLine((one) => {
      one.nominalVoltageKv = kv;
      one.sections = [{ kind: 'overhead', lengthKm: lengthMiles * 1.609344, earthResistivityOhmM: 100 }];
      const pu = (value: number) => ({ value, unit: 'pu', baseMva: 100 });
      one.declared = [{ circuit: 1, r1: pu(r), x1: pu(TEST_SYSTEM_BRANCH[which]), b1: pu(b) }];
    });
    const found = answers(line);
    if (isCaught)
      expect(found.some((code) => ['typical.wave-speed', 'typical.x1'].includes(code))).toBe(true);
    else expect(found).toEqual([]);
  });
});
