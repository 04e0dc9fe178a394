import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { CauseCode } from '#shared/checks/types';
import { allFindings, groupsOf, isSeen } from './confusion';
import type { Key, LineJson, Structure } from './filing-line';
import { KEYS, readOne, solve } from './filing-line';
import type { Random } from './random';
import { seeded, toDigits } from './random';
import { file } from './slip-tools';
import { plant } from './slips';

/** Slips that stay in one kind of constant, by the constants that they are planted in. */
const PARTS: readonly { keys: readonly Key[]; codes: readonly CauseCode[] }[] = [
  {
    keys: ['x1'],
    codes: ['per-mile', 'total', 'frequency', 'decimal-shift', 'radius-for-gmr', 'single-conductor'],
  },
  {
    keys: ['b1'],
    codes: [
      'half-charging',
      'double-charging',
      'capacitance',
      'per-mile',
      'gmr-for-radius',
      'diameter-for-radius',
    ],
  },
  { keys: ['r1'], codes: ['per-mile', 'resistance-at-20c', 'decimal-shift', 'total'] },
  { keys: ['x0', 'r0'], codes: ['per-mile', 'no-ground-wires', 'total'] },
  { keys: ['b0'], codes: ['half-charging', 'per-mile', 'decimal-shift'] },
];

/** What became of lines with two slips. */
export interface TwoSlips {
  planted: number;
  seen: number;
  bothFirst: number;
  missed: Map<string, number>;
}

/** Takes the values of some constants from a line with a slip. */
function take(into: LineJson, from: LineJson, keys: readonly Key[]): void {
  into.declared.forEach((entry, index) => {
    for (const key of keys) {
      const other = from.declared[index]?.[key];
      if (other !== undefined) entry[key] = other;
    }
  });
}

function isMoved(line: LineJson, fair: LineJson, keys: readonly Key[]): boolean {
  return keys.some((key) => {
    const value = line.declared[0]?.[key];
    const honest = fair.declared[0]?.[key];
    return (
      value !== undefined &&
      honest !== undefined &&
      (value.unit !== honest.unit || Math.abs(value.value / honest.value - 1) > 0.3)
    );
  });
}

/** Plants two slips in different constants, with noise on every value, and counts how often both stand first. */
export function twoSlips(
  draw: (random: Random, ordinal: number) => Structure,
  wanted: number,
  seed: number,
  noise: number,
): TwoSlips {
  const random = seeded(seed);
  const result: TwoSlips = { planted: 0, seen: 0, bothFirst: 0, missed: new Map() };
  for (let tries = 0; result.planted < wanted && tries < wanted * 20; tries++) {
    const structure = draw(random, tries);
    const fair = file(structure, solve(structure).circuits);
    const line = structuredClone(fair);
    const one = random.pick(PARTS);
    const two = random.pick(PARTS.filter((part) => part !== one));
    const codes: CauseCode[] = [];
    for (const part of [one, two]) {
      const code = random.pick(part.codes);
      const planted = plant(code, structure, random);
      if (planted === null || !isMoved(planted.line, fair, part.keys)) continue;
      take(line, planted.line, part.keys);
      codes.push(code);
    }
    if (codes.length !== 2) continue;
    for (const entry of line.declared) {
      for (const key of KEYS) {
        entry[key].value = toDigits(entry[key].value * (1 + random.between(-noise, noise)), 6);
      }
    }
    result.planted += 1;
    judge(result, line, codes);
  }
  return result;
}

function judge(result: TwoSlips, line: LineJson, codes: readonly CauseCode[]): void {
  const findings = allFindings(checkLine(readOne(line), DEFAULT_RULE_SET));
  if (!isSeen(findings)) return;
  result.seen += 1;
  const groups = groupsOf(findings);
  if (codes.every((code) => groups.some(({ first }) => first.has(code)))) result.bothFirst += 1;
  else {
    const words = `${codes.join(' & ')} → ${groups.map(({ first }) => [...first].join('=')).join(' + ') || 'none'}`;
    result.missed.set(words, (result.missed.get(words) ?? 0) + 1);
  }
}
