import type { PointerFault } from '../contracts/faults';
import { inWords, shown } from '../contracts/faults';
import { BAND_PARAMETERS, LINE_PARAMETERS, MUTUAL_PARAMETERS } from './parameters';
import type { Band, Tolerances, Uncertainties } from './rule-set';

/** What came of a file of rules: its content, or every fault of it. */
export type RuleFile<T> = { ok: true; value: T } | { ok: false; faults: PointerFault[] };

type Members = Record<string, unknown>;

/** Collects faults while a file is walked. */
class Walk {
  readonly faults: PointerFault[] = [];

  fault(pointer: string, value: unknown, expected: string): void {
    const message = `${pointer === '' ? 'The file' : pointer} is ${inWords(value)}; wanted is ${expected}.`;
    this.faults.push({ pointer, value: shown(value), expected, message });
  }

  members(value: unknown, pointer: string, known: readonly string[]): Members {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      this.fault(pointer, value, 'an object');
      return {};
    }
    const members = value as Members;
    for (const key of Object.keys(members)) {
      if (!known.includes(key)) this.fault(`${pointer}/${key}`, members[key], `one of ${known.join(', ')}`);
    }
    return members;
  }

  number(value: unknown, pointer: string, least: number): number {
    if (typeof value === 'number' && Number.isFinite(value) && value >= least) return value;
    this.fault(pointer, value, Number.isFinite(least) ? `a number of at least ${least}` : 'a finite number');
    return NaN;
  }
}

const BAND_KEYS = ['classKv', 'frequencyHz', 'parameter', 'typical', 'outer', 'source'] as const;

/**
 * Reads a file of bands: a list in the shape that `npm run check -- --bands` takes.
 *
 * @param json anything that came as JSON
 * @returns the bands, or every fault
 */
export function readBands(json: unknown): RuleFile<Band[]> {
  const walk = new Walk();
  if (!Array.isArray(json)) {
    walk.fault('', json, 'a list of bands');
    return { ok: false, faults: walk.faults };
  }
  const bands = json.map((entry: unknown, index) => readBand(walk, entry, `/${index}`));
  const seen = new Set<string>();
  bands.forEach((band, index) => {
    const key = `${band.classKv} ${band.frequencyHz} ${band.parameter}`;
    if (seen.has(key)) walk.fault(`/${index}`, key, 'one band for each class, frequency and parameter');
    seen.add(key);
  });
  return walk.faults.length === 0 ? { ok: true, value: bands } : { ok: false, faults: walk.faults };
}

function readBand(walk: Walk, entry: unknown, pointer: string): Band {
  const members = walk.members(entry, pointer, BAND_KEYS);
  const parameter = BAND_PARAMETERS.find((name) => name === members['parameter']);
  if (parameter === undefined) {
    walk.fault(`${pointer}/parameter`, members['parameter'], `one of ${BAND_PARAMETERS.join(', ')}`);
  }
  const typical = readRange(walk, members['typical'], `${pointer}/typical`);
  const outer = readRange(walk, members['outer'], `${pointer}/outer`);
  if (outer[0] > typical[0] || outer[1] < typical[1]) {
    walk.fault(`${pointer}/outer`, members['outer'], 'a range around the typical one');
  }
  const frequencyHz = members['frequencyHz'];
  if (frequencyHz !== 50 && frequencyHz !== 60) walk.fault(`${pointer}/frequencyHz`, frequencyHz, '50 or 60');
  const source = members['source'];
  if (typeof source !== 'string') walk.fault(`${pointer}/source`, source, 'a text');
  return {
    classKv: walk.number(members['classKv'], `${pointer}/classKv`, 1),
    frequencyHz: frequencyHz === 50 ? 50 : 60,
    parameter: parameter ?? 'x1',
    typical,
    outer,
    source: typeof source === 'string' ? source : '',
  };
}

function readRange(walk: Walk, value: unknown, pointer: string): [number, number] {
  if (!Array.isArray(value) || value.length !== 2) {
    walk.fault(pointer, value, 'a list of two numbers, low and high');
    return [NaN, NaN];
  }
  const low = walk.number(value[0], `${pointer}/0`, -Infinity);
  const high = walk.number(value[1], `${pointer}/1`, -Infinity);
  if (low >= high) walk.fault(pointer, value, 'a low limit below the high one');
  return [low, high];
}

const UNCERTAINTY_KEYS: readonly (keyof Uncertainties)[] = [
  'heightM',
  'sagM',
  'offsetM',
  'diameterRelative',
  'gmrRelative',
  'acResistanceRelative',
  'temperatureK',
  'groundWireResistanceRelative',
  'earthResistivityFactor',
];

/**
 * Reads a file of tolerances and uncertainties; what it leaves out stays as it was.
 *
 * @param json anything that came as JSON
 * @param before the tolerances and uncertainties that it changes
 * @returns both, or every fault
 */
export function readTolerances(
  json: unknown,
  before: { tolerances: Tolerances; uncertainties: Uncertainties },
): RuleFile<{ tolerances: Tolerances; uncertainties: Uncertainties }> {
  const walk = new Walk();
  const members = walk.members(json, '', ['tolerances', 'uncertainties']);
  const tolerances = { ...before.tolerances };
  const names = [...LINE_PARAMETERS, ...MUTUAL_PARAMETERS];
  const given = walk.members(members['tolerances'] ?? {}, '/tolerances', names);
  for (const name of names) {
    if (given[name] === undefined) continue;
    const pointer = `/tolerances/${name}`;
    const entry = walk.members(given[name], pointer, ['relative', 'cap']);
    const relative = walk.number(entry['relative'], `${pointer}/relative`, 0);
    const cap = entry['cap'] === undefined ? relative : walk.number(entry['cap'], `${pointer}/cap`, 0);
    tolerances[name] = { relative, cap };
  }
  const uncertainties = { ...before.uncertainties };
  const inputs = walk.members(members['uncertainties'] ?? {}, '/uncertainties', UNCERTAINTY_KEYS);
  for (const key of UNCERTAINTY_KEYS) {
    if (inputs[key] === undefined) continue;
    uncertainties[key] = walk.number(
      inputs[key],
      `/uncertainties/${key}`,
      key === 'earthResistivityFactor' ? 1 : 0,
    );
  }
  return walk.faults.length === 0
    ? { ok: true, value: { tolerances, uncertainties } }
    : { ok: false, faults: walk.faults };
}
