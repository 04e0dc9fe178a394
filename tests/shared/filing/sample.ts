/** The filing format's own example and ways to change it, for the tests of reading. */
import { readFileSync } from 'node:fs';
import { readJsonText } from '#shared/contracts/json-text';
import { readFiling } from '#shared/filing/read-filing';
import type { ReadContext } from '#shared/filing/read-filing';
import { STARTING_LIBRARY } from '#shared/library/conductors';

/** What the tests read with: the starting library, 100 MVA, 100 Ω·m. */
export const CONTEXT: ReadContext = {
  library: STARTING_LIBRARY,
  owner: { baseMva: 100, earthResistivityOhmM: 100 },
};

/** Text of the example filing that the format's description prints. */
export const EXAMPLE_TEXT = readFileSync(
  new URL('../../golden/filing/harrow-fell.json', import.meta.url),
  'utf8',
);

type Json = Record<string, unknown> & { lines: Line[] };
/** A line as JSON gives it, without a type that would forbid the tests to break it. */
export type Line = ReturnType<typeof JSON.parse>;

/** A fresh copy of the example. */
export function example(): Json {
  return JSON.parse(EXAMPLE_TEXT) as Json;
}

/** The example with its line changed. */
export function changed(change: (line: Line) => void): Json {
  const filing = example();
  const [line] = filing.lines;
  if (!line) throw new Error('the example has no line');
  change(line);
  return filing;
}

/** Reads the text of a filing with its digits. */
export function readText(text: string) {
  const { value, written, faults } = readJsonText(text);
  if (faults.length > 0) throw new Error(faults.map((f) => f.message).join('\n'));
  return readFiling(value, { ...CONTEXT, written });
}

/** The only line of a filing that must hold. */
export function onlyLine(json: unknown) {
  const read = readFiling(json, CONTEXT);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const [line] = read.filing.lines;
  if (!line) throw new Error('no line');
  return { line, notices: read.notices };
}

/** The faults of a filing that must not hold, as `pointer: message`. */
export function faultsOf(json: unknown): string[] {
  const read = readFiling(json, CONTEXT);
  return read.ok ? [] : read.faults.map((f) => `${f.pointer}: ${f.message}`);
}
