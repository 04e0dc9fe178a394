import { describe, expect, it } from 'vitest';
import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { CAUSE_CODES } from '#shared/checks/types';
import { allFindings, confusionTable } from './generator/confusion';
import type { Row } from './generator/confusion';
import type { Structure } from './generator/filing-line';
import { KEYS, readOne, solve } from './generator/filing-line';
import { BAND_CLASSES, CLASSES, randomLine } from './generator/lines';
import type { Random } from './generator/random';
import { seeded } from './generator/random';
import { inOtherUnits, secondLine } from './generator/second-lines';
import { file } from './generator/slip-tools';
import { twoSlips } from './generator/two-slips';

/** Lines are drawn and solved by the hundred here. */
const PATIENCE_MS = 120_000;

const GENERATORS: readonly { name: string; draw: (random: Random, ordinal: number) => Structure }[] = [
  { name: 'lines of the classes and the library', draw: randomLine },
  { name: 'lines of another make', draw: secondLine },
];

function shares(rows: readonly Row[]): { seen: number; first: number; amongThree: number; words: string } {
  const sum = (of: (row: Row) => number): number => rows.reduce((total, row) => total + of(row), 0);
  const seen = sum(({ planted, unseen }) => planted - unseen);
  const words = rows
    .filter(({ instead }) => instead.size > 0)
    .map(({ code, instead }) => `${code}: ${[...instead.keys()].join(', ')}`)
    .join('; ');
  return {
    seen,
    first: sum(({ first }) => first) / seen,
    amongThree: sum((row) => row.amongThree) / seen,
    words,
  };
}

describe('one planted slip of each code', () => {
  it(
    'is first in 98 % and among the three in 99 %: lines of the classes and the library',
    { timeout: PATIENCE_MS },
    () => {
      const rows = confusionTable(randomLine, 6, 20_270_301);
      expect(rows.map(({ code }) => code)).toEqual([...CAUSE_CODES]);
      const { seen, first, amongThree, words } = shares(rows);
      expect(seen).toBeGreaterThan(150);
      expect(first, words).toBeGreaterThanOrEqual(0.98);
      expect(amongThree, words).toBeGreaterThanOrEqual(0.99);
    },
  );

  it(
    'is so for lines of another make, in other units and with four or five digits',
    { timeout: PATIENCE_MS },
    () => {
      const { seen, first, amongThree, words } = shares(confusionTable(secondLine, 6, 1_887, inOtherUnits));
      expect(seen).toBeGreaterThan(150);
      expect(first, words).toBeGreaterThanOrEqual(0.98);
      expect(amongThree, words).toBeGreaterThanOrEqual(0.99);
    },
  );
});

describe('two slips at once with 0.3 % noise', () => {
  it.each(GENERATORS)('are both first in 95 %: $name', { timeout: PATIENCE_MS }, ({ draw }) => {
    const { planted, seen, bothFirst, missed } = twoSlips(draw, 60, 99, 0.003);
    expect(planted).toBe(60);
    expect(bothFirst / seen, [...missed.keys()].join('; ')).toBeGreaterThanOrEqual(0.95);
  });
});

describe('honest values up to 0.6 % off', () => {
  it('must be answered in 1 % at most', { timeout: PATIENCE_MS }, () => {
    const random = seeded(4);
    let answered = 0;
    const lines = 200;
    for (let ordinal = 0; ordinal < lines; ordinal++) {
      const structure = randomLine(random, ordinal);
      const line = file(structure, solve(structure).circuits);
      for (const entry of line.declared) {
        for (const key of KEYS) entry[key].value *= 1 + random.between(-0.006, 0.006);
      }
      const found = allFindings(checkLine(readOne(line), DEFAULT_RULE_SET));
      if (found.some(({ grade }) => grade === 'must-answer')) answered += 1;
    }
    expect(answered / lines).toBeLessThanOrEqual(0.01);
  });

  it('of lines of another make are never contradicted by the geometry', { timeout: PATIENCE_MS }, () => {
    const random = seeded(8);
    for (let ordinal = 0; ordinal < 100; ordinal++) {
      const structure = secondLine(random, ordinal);
      const line = file(structure, solve(structure).circuits);
      for (const entry of line.declared) {
        for (const key of KEYS) entry[key].value *= 1 + random.between(-0.006, 0.006);
      }
      const found = allFindings(checkLine(readOne(line), DEFAULT_RULE_SET, { causes: false }));
      expect(found.filter(({ family, grade }) => family === 'geometry' && grade !== 'note')).toEqual([]);
    }
  });
});

describe('the generator', () => {
  it('draws lines of every class that has a band', () => {
    const drawn = new Set(CLASSES.map(({ kv, hz }) => `${kv}/${hz}`));
    expect([...drawn].sort()).toEqual([...BAND_CLASSES].sort());
  });
});
