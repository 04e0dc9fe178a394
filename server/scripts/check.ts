import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { buffer } from 'node:stream/consumers';
import { checkFiling, worstGrade } from '../../shared/checks/check-filing';
import { DEFAULT_RULE_SET } from '../../shared/checks/defaults/rule-set';
import type { RuleSet } from '../../shared/checks/rule-set';
import { readBands, readTolerances } from '../../shared/checks/rule-set-file';
import type { RuleFile } from '../../shared/checks/rule-set-file';
import type { Fault } from '../../shared/contracts/faults';
import type { Notice } from '../../shared/filing/types';
import { readJsonText } from '../../shared/contracts/json-text';
import { STARTING_LIBRARY } from '../../shared/library/conductors';
import { readFilingFile } from '../files/read-filing-file';
import { USAGE, readArguments } from './check-arguments';
import type { CheckArguments } from './check-arguments';
import { faultLines, reportLines, summaryLines } from './check-table';

/** Most lines that the command reads of one CSV file. */
const MAX_ROWS = 50_000;

/** Largest file that the command reads. */
const MAX_BYTES = 200 * 1024 * 1024;

const STATUS = { fine: 0, mustAnswer: 1, unusable: 2 } as const;

/** Faults that end the command; thrown inside this file only. */
class Unusable extends Error {
  constructor(
    readonly of: string,
    readonly faults: readonly Fault[],
  ) {
    super('unusable input');
  }
}

/**
 * Runs the command.
 *
 * @param words the command line behind the script's name
 * @returns the exit status
 */
export async function main(words: readonly string[]): Promise<number> {
  // A reader that has seen enough closes the pipe; that is no fault.
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
  });
  const read = readArguments(words);
  if (read.kind === 'help') {
    process.stdout.write(USAGE);
    return STATUS.fine;
  }
  if (read.kind === 'wrong') {
    tellFaults('The command line', read.faults, read.isJson);
    process.stderr.write(`\n${USAGE}`);
    return STATUS.unusable;
  }
  try {
    return await check(read.arguments);
  } catch (error) {
    if (!(error instanceof Unusable)) return tellFailure(error, read.arguments.isJson);
    tellFaults(error.of, error.faults, read.arguments.isJson);
    return STATUS.unusable;
  }
}

async function check(wanted: CheckArguments): Promise<number> {
  const rules = await readRules(wanted);
  const bytes = await readBytes(wanted.file);
  const read = readFilingFile(bytes, wanted.file, {
    library: STARTING_LIBRARY,
    owner: rules.owner,
    maxRows: MAX_ROWS,
    maxBytes: MAX_BYTES,
    ...(wanted.format === undefined ? {} : { format: wanted.format }),
  });
  if (read.filing === null) throw new Unusable(nameOf(wanted.file), read.faults);
  const report = checkFiling(read.filing, rules, {
    frequenciesHz: wanted.frequenciesHz,
    matrices: wanted.wantsMatrices,
  });
  tellNotices(read.notices);
  if (wanted.isJson) {
    process.stdout.write(`${JSON.stringify(report)}\n`);
    process.stderr.write(`${summaryLines(report).join('\n')}\n`);
  } else {
    process.stdout.write(`${reportLines(report, process.stdout.isTTY === true).join('\n')}\n`);
  }
  return worstGrade(report) === 'must-answer' ? STATUS.mustAnswer : STATUS.fine;
}

function nameOf(file: string): string {
  return file === '-' ? 'Standard input' : file;
}

async function readBytes(file: string): Promise<Uint8Array> {
  try {
    return file === '-' ? await buffer(process.stdin) : await readFile(file);
  } catch (error) {
    const reason =
      (error as NodeJS.ErrnoException).code === 'ENOENT' ? 'there is no such file' : 'it cannot be read';
    const message = `${nameOf(file)}: ${reason}.`;
    throw new Unusable(nameOf(file), [
      { pointer: '', value: file, expected: 'a file that can be read', message },
    ]);
  }
}

/** The default rules with what the files on the command line put in their place. */
async function readRules({ bandsFile, tolerancesFile }: CheckArguments): Promise<RuleSet> {
  let rules: RuleSet = DEFAULT_RULE_SET;
  if (bandsFile !== undefined) {
    const { value, version } = await readRuleFile(bandsFile, readBands);
    rules = { ...rules, bands: value, bandsVersion: version };
  }
  if (tolerancesFile !== undefined) {
    const before = rules;
    const { value, version } = await readRuleFile(tolerancesFile, (json) => readTolerances(json, before));
    rules = { ...rules, ...value, tolerancesVersion: version };
  }
  return rules;
}

async function readRuleFile<T>(
  file: string,
  read: (json: unknown) => RuleFile<T>,
): Promise<{ value: T; version: string }> {
  const bytes = await readBytes(file);
  const json = readJsonText(new TextDecoder().decode(bytes));
  if (json.faults.length > 0) throw new Unusable(nameOf(file), json.faults);
  const result = read(json.value);
  if (!result.ok) throw new Unusable(nameOf(file), result.faults);
  const version = `file-${createHash('sha256').update(bytes).digest('hex').slice(0, 12)}`;
  return { value: result.value, version };
}

/** Each notice once, with how often it was given. */
function tellNotices(notices: readonly Notice[]): void {
  const counts = new Map<string, number>();
  for (const { message } of notices) counts.set(message, (counts.get(message) ?? 0) + 1);
  for (const [message, count] of counts) {
    process.stderr.write(`Note: ${message}${count > 1 ? ` (${count} times)` : ''}\n`);
  }
}

/** A fault of our own: said in one sentence, so that nobody takes a stack trace for an answer. */
function tellFailure(error: unknown, isJson: boolean): number {
  const reason = error instanceof Error ? error.message : String(error);
  const message = `The check itself failed: ${reason}.`;
  tellFaults('The check', [{ pointer: '', value: null, expected: 'a check that ends', message }], isJson);
  return STATUS.unusable;
}

function tellFaults(of: string, faults: readonly Fault[], isJson: boolean): void {
  if (isJson) process.stdout.write(`${JSON.stringify({ faults })}\n`);
  process.stderr.write(`${faultLines(of, faults).join('\n')}\n`);
}
