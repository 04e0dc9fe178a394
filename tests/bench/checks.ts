import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { CAUSE_CODES } from '#shared/checks/types';
import type { NormalisedLine } from '#shared/filing/types';
import { confusionTable } from '../shared/checks/generator/confusion';
import type { Row } from '../shared/checks/generator/confusion';
import { readOne, solve } from '../shared/checks/generator/filing-line';
import { randomLine } from '../shared/checks/generator/lines';
import { seeded } from '../shared/checks/generator/random';
import { inOtherUnits, secondLine } from '../shared/checks/generator/second-lines';
import { file } from '../shared/checks/generator/slip-tools';
import { plant } from '../shared/checks/generator/slips';
import { twoSlips } from '../shared/checks/generator/two-slips';
import { leastNs, row } from './rows';
import type { BenchRow } from './rows';

const PER_CODE = 24;
const TWO_SLIPS = 200;

/** Prints to standard error, so that `--json` keeps standard output to itself. */
function say(line: string): void {
  process.stderr.write(`${line}\n`);
}

interface Totals {
  planted: number;
  seen: number;
  first: number;
  amongThree: number;
}

function totalsOf(rows: readonly Row[]): Totals {
  const totals = { planted: 0, seen: 0, first: 0, amongThree: 0 };
  for (const { planted, unseen, first, amongThree } of rows) {
    totals.planted += planted;
    totals.seen += planted - unseen;
    totals.first += first;
    totals.amongThree += amongThree;
  }
  return totals;
}

function printConfusion(title: string, rows: readonly Row[]): Totals {
  say(`\n${title}`);
  say(`${'slip'.padEnd(24)} planted  unseen   first  three  instead`);
  for (const { code, planted, unseen, first, amongThree, instead } of rows) {
    const figures = [planted, unseen, first, amongThree].map((value) => String(value).padStart(7)).join('');
    const others = [...instead].map(([words, count]) => `${words} (${count})`).join('; ');
    say(`${code.padEnd(24)}${figures}  ${others}`.trimEnd());
  }
  const totals = totalsOf(rows);
  say(
    `${'all'.padEnd(24)}${[totals.planted, totals.planted - totals.seen, totals.first, totals.amongThree].map((value) => String(value).padStart(7)).join('')}`,
  );
  return totals;
}

function shareRows(name: string, { seen, first, amongThree }: Totals): BenchRow[] {
  return [
    row(`checks/${name}/first`, first, 'lines', 'lines with a slip seen', seen),
    row(`checks/${name}/among-three`, amongThree, 'lines', 'lines with a slip seen', seen),
  ];
}

/** Lines with one slip each, of all codes in turn, and the same lines with honest values. */
function workload(): { slipped: NormalisedLine[]; honest: NormalisedLine[] } {
  const random = seeded(6);
  const slipped: NormalisedLine[] = [];
  const honest: NormalisedLine[] = [];
  for (let ordinal = 0; slipped.length < 200; ordinal++) {
    const structure = randomLine(random, ordinal);
    const code = CAUSE_CODES[ordinal % CAUSE_CODES.length];
    const planted = code === undefined ? null : plant(code, structure, random);
    if (planted === null) continue;
    slipped.push(readOne(planted.line));
    honest.push(readOne(file(structure, solve(structure).circuits)));
  }
  return { slipped, honest };
}

/**
 * The confusion tables of the causes, and what a check costs with causes against one without.
 *
 * @returns shares of right causes, and times per line
 */
export async function benchChecks(): Promise<BenchRow[]> {
  const own = printConfusion(
    'Lines of the classes and the library, six digits',
    confusionTable(randomLine, PER_CODE, 41),
  );
  const other = printConfusion(
    'Lines of another make, in other units, four or five digits',
    confusionTable(secondLine, PER_CODE, 43, inOtherUnits),
  );
  const two = twoSlips(randomLine, TWO_SLIPS, 47, 0.003);
  say(`\nTwo slips with 0.3 % noise: both first in ${two.bothFirst} of ${two.seen}`);
  for (const [words, count] of two.missed) say(`  ${words} (${count})`);
  const { slipped, honest } = workload();
  const at = (lines: readonly NormalisedLine[], k: number): NormalisedLine =>
    lines[k % lines.length] as NormalisedLine;
  const withCauses = leastNs((k) => checkLine(at(slipped, k), DEFAULT_RULE_SET), 4, slipped.length);
  const without = leastNs(
    (k) => checkLine(at(slipped, k), DEFAULT_RULE_SET, { causes: false }),
    2,
    slipped.length,
  );
  const plain = leastNs((k) => checkLine(at(honest, k), DEFAULT_RULE_SET), 2, honest.length);
  return Promise.resolve([
    ...shareRows('planted', own),
    ...shareRows('planted-elsewhere', other),
    row('checks/two-slips/both-first', two.bothFirst, 'lines', 'lines with two slips seen', two.seen),
    row('checks/line-with-causes', withCauses, 'ns', 'checks/line-without-causes', without),
    row('checks/line-in-balance', plain, 'ns', 'checks/line-without-causes', without),
  ]);
}
