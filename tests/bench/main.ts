import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { BenchRow } from './rows';

/**
 * `npm run bench`: runs the groups of benchmarks and prints a table, or with `--json` one JSON document on standard
 * output. `--only GROUP` runs one group. Ratios only compare what was measured in the same run.
 */

interface Group {
  name: string;
  run: () => Promise<BenchRow[]>;
}

/** Each group is a file of this folder that exports one function; a group whose file is not there does not run. */
const GROUPS = [
  { name: 'engine', file: './engine.ts', export: 'benchEngine' },
  { name: 'checks', file: './checks.ts', export: 'benchChecks' },
] as const;

function findGroups(): Group[] {
  return GROUPS.filter((group) => existsSync(fileURLToPath(new URL(group.file, import.meta.url)))).map(
    (group) => ({
      name: group.name,
      run: async () => {
        const module = (await import(group.file)) as Record<string, () => Promise<BenchRow[]>>;
        const run = module[group.export];
        if (!run) throw new Error(`${group.file} exports no ${group.export}`);
        return run();
      },
    }),
  );
}

interface Options {
  json: boolean;
  only: string | null;
}

function readOptions(args: readonly string[]): Options {
  const options: Options = { json: false, only: null };
  for (let i = 0; i < args.length; i++) {
    const arg = args[i];
    if (arg === '--json') options.json = true;
    else if (arg === '--only') options.only = args[++i] ?? '';
    else throw new Error(`unknown argument ${arg}; known are --json and --only GROUP`);
  }
  return options;
}

/** A number with four significant digits and groups of three, for people. */
function show(value: number): string {
  if (!Number.isFinite(value)) return String(value);
  return Number(value.toPrecision(4)).toLocaleString('en-GB', { maximumSignificantDigits: 4 });
}

function printTable(rows: readonly BenchRow[]): void {
  const cells = rows.map((r) => [r.name, show(r.value), r.unit, show(r.ratio), `× ${r.against}`]);
  const width = (column: number): number => Math.max(...cells.map((c) => (c[column] ?? '').length));
  const widths = [0, 1, 2, 3].map(width);
  for (const [name = '', value = '', unit = '', ratio = '', against = ''] of cells) {
    const left = `${name.padEnd(widths[0] ?? 0)}  ${value.padStart(widths[1] ?? 0)} ${unit.padEnd(widths[2] ?? 0)}`;
    process.stdout.write(`${left}  ${ratio.padStart(widths[3] ?? 0)} ${against}\n`);
  }
}

async function main(): Promise<void> {
  const options = readOptions(process.argv.slice(2));
  const groups = findGroups();
  const chosen = options.only === null ? groups : groups.filter((g) => g.name === options.only);
  if (chosen.length === 0) {
    throw new Error(`no group ${options.only}; there are ${groups.map((g) => g.name).join(', ')}`);
  }
  const rows: BenchRow[] = [];
  for (const group of chosen) {
    process.stderr.write(`measuring ${group.name} …\n`);
    rows.push(...(await group.run()));
  }
  if (options.json) process.stdout.write(`${JSON.stringify(rows, null, 1)}\n`);
  else printTable(rows);
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 2;
});
