import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { CauseCode, Finding, LineReport } from '#shared/checks/types';
import { CAUSE_CODES } from '#shared/checks/types';
import type { Structure } from './filing-line';
import { readOne } from './filing-line';
import type { Random } from './random';
import { seeded } from './random';
import { plant } from './slips';
import type { Planted } from './slips';

/** How one code came out. */
export interface Row {
  code: CauseCode;
  planted: number;
  /** Moved no declared value beyond tolerance. */
  unseen: number;
  first: number;
  amongThree: number;
  /** What stood first instead, and how often. */
  instead: Map<string, number>;
}

/** Every finding of a line. */
export function allFindings(report: LineReport): Finding[] {
  return [...report.circuits.flatMap(({ findings }) => findings), ...report.findings];
}

/** True when something of the line is contradicted or cannot be computed. */
export function isSeen(findings: readonly Finding[]): boolean {
  return findings.some(
    ({ family, grade, causes, code }) =>
      grade === 'must-answer' &&
      (family === 'geometry' || (family === 'drawing' && (causes.length > 0 || UNCOMPUTED.test(code)))),
  );
}

const UNCOMPUTED = /coincident|overlapping|in-ground|not-computable/;

/** The causes of each group, best first; a cause with the same correction as the first shares its place. */
export function groupsOf(findings: readonly Finding[]): { first: Set<string>; all: Set<string> }[] {
  const groups = new Map<number, Finding['causes']>();
  for (const { group, causes } of findings) {
    const known = groups.get(group) ?? [];
    if (causes.length > known.length) groups.set(group, causes);
    else if (!groups.has(group)) groups.set(group, known);
  }
  return [...groups.values()].flatMap((causes) => {
    const best = causes[0];
    if (best === undefined) return [];
    const sharing = causes.filter((cause) => isSame(cause.corrected, best.corrected));
    return [
      { first: new Set(sharing.map(({ code }) => code)), all: new Set(causes.map(({ code }) => code)) },
    ];
  });
}

function isSame(one: Record<string, number>, other: Record<string, number>): boolean {
  const keys = Object.keys(one);
  return (
    keys.length === Object.keys(other).length &&
    keys.every((key) => Math.abs((one[key] ?? NaN) - (other[key] ?? NaN)) <= 1e-6 * Math.abs(one[key] ?? 0))
  );
}

/** Plants every code many times and counts what the check says. */
export function confusionTable(
  draw: (random: Random, ordinal: number) => Structure,
  perCode: number,
  seed: number,
  finish: (planted: Planted, random: Random) => Planted = (planted) => planted,
): Row[] {
  const random = seeded(seed);
  return CAUSE_CODES.map((code) => {
    const row: Row = { code, planted: 0, unseen: 0, first: 0, amongThree: 0, instead: new Map() };
    for (let tries = 0; row.planted < perCode && tries < perCode * 12; tries++) {
      const drawn = plant(code, draw(random, tries), random);
      if (drawn !== null) count(row, finish(drawn, random));
    }
    return row;
  });
}

function count(row: Row, { line }: Planted): void {
  const findings = allFindings(checkLine(readOne(line), DEFAULT_RULE_SET));
  row.planted += 1;
  if (!isSeen(findings)) {
    row.unseen += 1;
    return;
  }
  const groups = groupsOf(findings);
  // One slip is one matter: every group must have it first, or the slip was torn apart.
  const isFirst = groups.length > 0 && groups.every(({ first }) => first.has(row.code));
  if (isFirst) row.first += 1;
  if (groups.length > 0 && groups.every(({ all }) => all.has(row.code))) row.amongThree += 1;
  if (!isFirst) {
    const words = groups.map(({ first }) => [...first].join('=')).join(' + ') || 'none';
    row.instead.set(words, (row.instead.get(words) ?? 0) + 1);
  }
}
