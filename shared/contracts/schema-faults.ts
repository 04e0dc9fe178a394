/** Turns what Ajv says into faults: one a place, at the place where something is to be done, in plain words. */
import type { ErrorObject } from 'ajv';
import { inOrder, inWords, numberInWords, pointerToken, pointerTokens, shown, valueAt } from './faults';
import type { PointerFault } from './faults';
import { FIELD_NAMES, fieldWords } from './field-words';
import { didYouMean } from './nearest';

/** What a rule of the schema wants, and the sentence that says so. */
interface Wish {
  expected: string;
  message: string;
}

/** What a wish is written from. */
interface Case {
  label: string;
  /** Thin space and unit, or nothing. */
  unit: string;
  value: unknown;
  params: Record<string, unknown>;
  tokens: string[];
  data: unknown;
}

/** Types of JSON Schema in words. */
const TYPE_WORDS: Readonly<Record<string, string>> = {
  number: 'a number',
  integer: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  object: 'an object',
  array: 'a list',
  null: 'null',
};

/** Fields whose words are a plural. */
const PLURAL = new Set([
  'lines',
  'sections',
  'declared',
  'conductors',
  'positions',
  'perLength',
  'ratings',
  'circuits',
]);

/** Wrappers that only say that something inside them is wrong. */
const NOISE = new Set(['if', 'anyOf', 'oneOf', 'allOf', 'propertyNames', '$ref']);

/** The plainest wish: what must be there, and what is. */
const must = (c: Case, expected: string): Wish => ({
  expected,
  message: `${c.label} must be ${expected}; ${inWords(c.value)} is there.`,
});

/** Comparisons of Ajv's limit keywords in words. */
const limitWords: Readonly<Record<string, string>> = {
  '>': 'more than',
  '>=': 'at least',
  '<': 'less than',
  '<=': 'at most',
};

/** A number beyond a limit of its range. */
function limit(c: Case): Wish {
  const words = limitWords[String(c.params['comparison'])] ?? '';
  return must(c, `${words} ${numberInWords(Number(c.params['limit']))}${c.unit}`);
}

/** A list or an object with too few or too many in it. */
const count = (one: string, many: string, words: string) => (c: Case) => {
  const n = Number(c.params['limit']);
  const expected = `${words} ${numberInWords(n)} ${n === 1 ? one : many}`;
  return { expected, message: `${c.label} must hold ${expected}.` };
};

/** A value that is none of a closed list; the nearest of the list are named. */
function choice(c: Case): Wish {
  const allowed = (c.params['allowedValues'] as unknown[]) ?? [];
  const list = allowed.map((v) => (typeof v === 'number' ? numberInWords(v) : String(v))).join(', ');
  const hint = typeof c.value === 'string' ? didYouMean(c.value, allowed.map(String)) : '';
  return {
    expected: `one of ${list}`,
    message: `${c.label} is ${inWords(c.value)}; it must be one of ${list}.${hint}`,
  };
}

/** A value of another type. A number in quotes is the slip that is seen most, and gets its own hint. */
function typeWish(c: Case): Wish {
  const types = [c.params['type']].flat().map((t) => TYPE_WORDS[String(t)] ?? String(t));
  const expected = types.join(' or ');
  const numberAsText = typeof c.value === 'string' && /number/.test(expected);
  const hint = numberAsText && /^-?\d+(\.\d+)?$/.test(String(c.value)) ? ' Leave out the quotes.' : '';
  return { ...must(c, expected + (c.unit ? ` in${c.unit}` : '')), message: must(c, expected).message + hint };
}

/** A field that is not there, with the unit that it is wanted in. */
function missing(c: Case): Wish {
  const named = c.unit ? ` Give it in${c.unit}.` : '';
  return {
    expected: `${c.label}${c.unit ? ` in${c.unit}` : ''}`,
    message: `${c.label} ${PLURAL.has(c.tokens.at(-1) ?? '') ? 'are' : 'is'} missing.${named}`,
  };
}

/** A field that the format does not have. */
function unknownField(c: Case): Wish {
  const name = String(c.params['additionalProperty']);
  return {
    expected: 'only fields of the format',
    message: `${inWords(name)} is not a field that is known here.${didYouMean(name, FIELD_NAMES)}`,
  };
}

/** A field that cannot stand beside what else is there. */
function misplaced(c: Case): Wish {
  const expected = 'nothing here';
  const parent = c.tokens.at(-3);
  const holder = valueAt(
    c.data,
    c.tokens
      .slice(0, -1)
      .map((t) => `/${pointerToken(t)}`)
      .join(''),
  );
  const has = (key: string) => typeof holder === 'object' && holder !== null && Object.hasOwn(holder, key);
  if (has('groundWire'))
    return { expected, message: `A ground wire has no ${c.label.toLowerCase()}: leave it out.` };
  if (has('library'))
    return {
      expected,
      message: `A library conductor brings its own data: leave out ${c.tokens.at(-1) ?? ''}.`,
    };
  if (parent === 'sections') {
    const kind = c.tokens.at(-1) === 'perLength' ? 'An overhead' : 'A cable';
    return { expected, message: `${kind} section has no ${c.tokens.at(-1) ?? ''}: leave it out.` };
  }
  return { expected, message: `${c.label} cannot stand here.` };
}

/** What each keyword of a schema wants; a keyword that is not here falls back on Ajv's own words. */
const WISHES: Readonly<Record<string, (c: Case) => Wish>> = {
  type: typeWish,
  required: missing,
  dependentRequired: (c) => ({
    expected: c.label,
    message: `${c.label} are missing: conductors and positions come together or not at all.`,
  }),
  additionalProperties: unknownField,
  unevaluatedProperties: unknownField,
  enum: choice,
  const: (c) => must(c, inWords(c.params['allowedValue'])),
  minimum: limit,
  maximum: limit,
  exclusiveMinimum: limit,
  exclusiveMaximum: limit,
  minLength: (c) => ({ expected: 'some text', message: `${c.label} is empty.` }),
  maxLength: (c) => ({
    expected: `at most ${numberInWords(Number(c.params['limit']))} characters`,
    message: `${c.label} is longer than ${numberInWords(Number(c.params['limit']))} characters.`,
  }),
  pattern: (c) => ({
    expected: 'text without control or invisible characters, not beginning or ending with a space',
    message: `${c.label} holds a character that is not allowed, or begins or ends with a space: ${inWords(c.value)}.`,
  }),
  format: (c) =>
    c.params['format'] === 'date'
      ? must(c, 'a day that exists, as YYYY-MM-DD')
      : must(c, `a ${String(c.params['format'])}`),
  minItems: count('entry', 'entries', 'at least'),
  maxItems: count('entry', 'entries', 'at most'),
  minProperties: count('field', 'fields', 'at least'),
  maxProperties: count('field', 'fields', 'at most'),
  uniqueItems: (c) => ({
    expected: 'entries that differ',
    message: `${c.label} holds the same entry twice.`,
  }),
  not: (c) => ({ expected: 'another name', message: `${inWords(c.value)} is a name that cannot be used.` }),
  'false schema': misplaced,
};

/** The place that an error is about: a missing or surplus field is its own place. */
function placeOf(e: ErrorObject): string {
  const params = e.params as Record<string, unknown>;
  const name =
    params['missingProperty'] ??
    params['additionalProperty'] ??
    params['unevaluatedProperty'] ??
    e.propertyName;
  return typeof name === 'string' ? `${e.instancePath}/${pointerToken(name)}` : e.instancePath;
}

/** One error of Ajv as one fault. */
function toFault(e: ErrorObject, data: unknown): PointerFault {
  const pointer = placeOf(e);
  const tokens = pointerTokens(pointer);
  const words = fieldWords(tokens.at(-1) ?? '', tokens.at(-2));
  const value = e.propertyName === undefined ? valueAt(data, pointer) : e.propertyName;
  const wish = (WISHES[e.keyword] ?? ((c: Case) => must(c, e.message ?? 'something else')))({
    label: tokens.length ? words.label : 'The whole',
    unit: words.unit ? `\u2009${words.unit}` : '',
    value,
    params: e.params as Record<string, unknown>,
    tokens,
    data,
  });
  return { pointer, value: shown(value), ...wish };
}

/**
 * Faults from the errors of a compiled validator.
 * @param errors what the validator left in its `errors`
 * @param data what was validated, for the values
 * @returns one fault a place, in the order of their pointers
 */
export function schemaFaults(errors: readonly ErrorObject[], data: unknown): PointerFault[] {
  const out = errors.filter((e) => e.keyword === 'false schema').map((e) => `${e.instancePath}/`);
  // What cannot stand here at all need not hold in itself.
  const told = errors.filter((e) => !NOISE.has(e.keyword) && !out.some((p) => placeOf(e).startsWith(p)));
  return inOrder(told.map((e) => toFault(e, data)));
}
