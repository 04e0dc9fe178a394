/** What the command was asked for. */
export interface CheckArguments {
  file: string;
  format?: 'json' | 'csv';
  isJson: boolean;
  wantsMatrices: boolean;
  frequenciesHz: number[];
  bandsFile?: string;
  tolerancesFile?: string;
}

/** The arguments, the wish for help, or what is wrong with them. */
export type ReadArguments =
  | { kind: 'check'; arguments: CheckArguments }
  | { kind: 'help' }
  | {
      kind: 'wrong';
      isJson: boolean;
      faults: { pointer: string; value: string; expected: string; message: string }[];
    };

export const USAGE = `Usage: npm run check -- FILE [options]

Reads a filing (JSON or CSV; - for standard input) and prints what does not balance, and why.

  --format json|csv     the format, where the name does not tell
  --json                one JSON document on standard output
  --frequencies 1,50    the constants at these frequencies too, Hz, 0.1 to 1e6 (with --json)
  --matrices            phase matrices of one-section lines (with --json)
  --bands FILE          bands in place of the default ones
  --tolerances FILE     tolerances and uncertainties in place of the default ones

Exit status: 0 nothing must be answered, 1 something must, 2 the input is not usable.
`;

const LOWEST_HZ = 0.1;
const HIGHEST_HZ = 1e6;

const WITH_VALUE = ['--format', '--frequencies', '--bands', '--tolerances'] as const;
type WithValue = (typeof WITH_VALUE)[number];

/** Reads the command line; every fault of it at once. */
export function readArguments(words: readonly string[]): ReadArguments {
  const result: CheckArguments = { file: '', isJson: false, wantsMatrices: false, frequenciesHz: [] };
  const faults: { pointer: string; value: string; expected: string; message: string }[] = [];
  const wrong = (value: string, expected: string): void => {
    const message = `${value === '' ? 'Something is missing' : value}: wanted is ${expected}.`;
    faults.push({ pointer: '', value, expected, message });
  };
  const left = [...words];
  for (let word = left.shift(); word !== undefined; word = left.shift()) {
    const [name = '', ...joined] = word.split('=');
    if (word === '--help' || word === '-h') return { kind: 'help' };
    if (word === '--json') result.isJson = true;
    else if (word === '--matrices') result.wantsMatrices = true;
    else if (isWithValue(name)) {
      const value = joined.length > 0 ? joined.join('=') : valueBehind(left);
      if (value === undefined) wrong(name, 'a value behind it');
      else takeValue(result, name, value, wrong);
    } else if (word.startsWith('--') || (word.startsWith('-') && word !== '-')) {
      wrong(word, 'an option that --help lists');
    } else if (result.file !== '') wrong(word, 'one file only');
    else result.file = word;
  }
  if (result.file === '' && faults.length === 0) wrong('', 'the name of a file, or - for standard input');
  return faults.length > 0
    ? { kind: 'wrong', isJson: result.isJson, faults }
    : { kind: 'check', arguments: result };
}

/** The word behind an option, taken off the list; an option is no value of another one. */
function valueBehind(left: string[]): string | undefined {
  return left[0]?.startsWith('--') === true ? undefined : left.shift();
}

function isWithValue(name: string): name is WithValue {
  return (WITH_VALUE as readonly string[]).includes(name);
}

function takeValue(
  result: CheckArguments,
  name: WithValue,
  value: string,
  wrong: (value: string, expected: string) => void,
): void {
  if (name === '--bands') result.bandsFile = value;
  else if (name === '--tolerances') result.tolerancesFile = value;
  else if (name === '--format') {
    if (value === 'json' || value === 'csv') result.format = value;
    else wrong(`--format ${value}`, 'json or csv');
  } else {
    for (const part of value.split(',')) {
      const frequencyHz = /^\d+(\.\d+)?(e[+-]?\d{1,2})?$/i.test(part.trim()) ? Number(part) : NaN;
      if (frequencyHz >= LOWEST_HZ && frequencyHz <= HIGHEST_HZ) result.frequenciesHz.push(frequencyHz);
      else wrong(`--frequencies ${part.trim() || value}`, 'numbers from 0.1 to 1e6, parted by commas');
    }
  }
}
