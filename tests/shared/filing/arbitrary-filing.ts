/** Filings at random, of every kind that the format has, as JSON text with digits as people write them. */
import fc from 'fast-check';

/** A number as text with up to `places` decimals, trailing zeros and all. */
export function digits(min: number, max: number, places = 4): fc.Arbitrary<string> {
  return fc
    .tuple(fc.double({ min, max, noNaN: true }), fc.integer({ min: 0, max: places }))
    .map(([x, n]) => x.toFixed(n))
    .filter((t) => Number(t) >= min && Number(t) <= max && !/^-0(\.0*)?$/.test(t));
}

/** Stands for a number in the JSON text: its digits are put in unquoted. */
class Digits {
  constructor(readonly text: string) {}
}

const num = (min: number, max: number, places?: number) => digits(min, max, places).map((t) => new Digits(t));

/** Texts that try CSV, JSON and spreadsheets: quotes, delimiters, formulas, accents. */
const awkward = fc.constantFrom(
  '=1+1',
  '-1',
  '+A1',
  '@SUM(1)',
  "'=x",
  "''-",
  '＝1',
  'a,b;c',
  '"q"',
  'Ostrø – Ny',
  'x\u00a0y',
  '1E5',
  '00012',
  '3-4',
  'true',
  'null',
  'sep=;',
);
const text = fc
  .oneof(awkward, fc.string({ unit: 'grapheme-ascii', minLength: 1, maxLength: 12 }))
  .filter((t) => t === t.trim() && t !== '' && !/[\u0000-\u001f\u007f]/.test(t));

const optional = <T>(name: string, value: fc.Arbitrary<T>) =>
  fc.option(value, { nil: undefined }).map((v): Record<string, T> => (v === undefined ? {} : { [name]: v }));

const both = (...parts: fc.Arbitrary<object>[]) =>
  fc.tuple(...parts).map((all) => Object.assign({}, ...all) as Record<string, unknown>);

const handbook = both(
  optional('name', text),
  fc.record({
    model: fc.constant('handbook'),
    diameterMm: num(3, 60),
    gmrMm: num(0.5, 30),
    acResistanceOhmPerKm: num(0.01, 6),
  }),
  optional('dcResistance20OhmPerKm', num(0.01, 6)),
  optional('temperatureC', num(10, 120, 0)),
);
const tube = both(
  optional('name', text),
  fc.record({
    model: fc.constant('tube'),
    diameterMm: num(3, 60),
    dcResistance20OhmPerKm: num(0.01, 6),
    temperatureC: num(10, 120, 1),
  }),
  optional('coreDiameterMm', num(0, 3)),
  optional('temperatureCoefficientPerK', num(0.001, 0.006, 5)),
);
const library = fc.record({
  library: fc.constantFrom('Drake', 'Cardinal', '243-AL1/39-ST1A', '7 No.8 Alumoweld'),
  temperatureC: num(20, 80, 0),
});
const conductor = fc.oneof(handbook, tube, library);

const R_UNITS = ['ohm/km', 'ohm/mi', 'ohm/kft', 'ohm', 'pu', '%'] as const;
const X_UNITS = [...R_UNITS, 'mH/km', 'mH/mi'] as const;
const B_UNITS = ['uS/km', 'uS/mi', 'uS', 'nF/km', 'nF/mi', 'uF/km', 'pu', '%', 'Mvar'] as const;

interface Base {
  baseMva?: Digits;
  baseKv?: Digits;
}

const quantity = (units: readonly string[], base: Base) =>
  fc
    .record({ value: num(-500, 5000, 6), unit: fc.constantFrom(...units) })
    .map((q) => (q.unit === 'pu' || q.unit === '%' ? { ...q, ...base } : q));

const values = (base: Base, optionalZero: boolean) => {
  const zero = { r0: quantity(R_UNITS, base), x0: quantity(X_UNITS, base), b0: quantity(B_UNITS, base) };
  const one = fc.record({
    r1: quantity(R_UNITS, base),
    x1: quantity(X_UNITS, base),
    b1: quantity(B_UNITS, base),
  });
  const rest = Object.entries(zero).map(([k, v]) =>
    optionalZero ? optional(k, v) : v.map((x) => ({ [k]: x })),
  );
  return both(one, ...rest);
};

const basis = both(
  fc.record({ kind: fc.constantFrom('calculated', 'measured') }),
  optional('status', fc.constantFrom('design', 'as-built')),
  optional('engineer', text),
  optional('date', fc.constant('2027-02-01')),
);
const rating = both(
  fc.record({ season: text, continuousA: num(100, 4000, 0) }),
  optional('emergencyA', num(100, 5000, 1)),
);

const declared = (circuit: number, base: Base) =>
  both(
    fc.constant({ circuit }),
    values(base, true),
    optional('circuitId', text),
    optional('ratingA', num(100, 4000, 1)),
    optional('maxTemperatureC', num(40, 120, 0)),
    fc.array(rating, { maxLength: 4 }).map((ratings) => (ratings.length ? { ratings } : {})),
    optional('basis', basis),
  );

const place = fc.record({ horizontalM: num(-60, 60), attachmentHeightM: num(5, 90), sagM: num(0, 20) });

const overhead = (circuits: number) => {
  const bundle = fc.oneof(
    fc.constant({}),
    fc.record({ bundleCount: fc.integer({ min: 2, max: 8 }), bundleSpacingM: num(0.2, 1) }),
  );
  const phases = fc
    .tuple(bundle, fc.array(place, { minLength: 3 * circuits, maxLength: 3 * circuits }))
    .map(([b, places]) =>
      places.map((p, i) => ({
        circuit: Math.floor(i / 3) + 1,
        phase: 'abc'[i % 3],
        conductor: 'p/1',
        ...p,
        ...b,
      })),
    );
  const wires = fc
    .array(place, { maxLength: 4 })
    .map((ps) => ps.map((p) => ({ groundWire: true, conductor: 'g~w', ...p })));
  const geometry = fc
    .record({ conductors: fc.record({ 'p/1': conductor, 'g~w': conductor }), phases, wires })
    .map(({ conductors, phases: p, wires: w }) => ({ conductors, positions: [...p, ...w] }));
  return both(
    fc.record({ lengthKm: num(0.1, 300) }),
    optional('earthResistivityOhmM', num(1, 5000, 1)),
    optional('groundWireBonding', fc.constantFrom('continuous', 'segmented')),
    fc.oneof({ weight: 5, arbitrary: geometry }, { weight: 1, arbitrary: fc.constant({}) }),
  );
};

const cable = (circuits: number, base: Base) => {
  const each = fc.tuple(values(base, false), values(base, false)).map(([a, b]) => [
    { circuit: 1, ...a },
    { circuit: 2, ...b },
  ]);
  const perLength: fc.Arbitrary<unknown> =
    circuits === 2 ? fc.oneof(values(base, false), each) : values(base, false);
  return fc.record({ kind: fc.constant('cable'), lengthKm: num(0.1, 20), perLength });
};

const line = fc
  .record({
    circuits: fc.constantFrom(1, 2),
    base: both(
      optional('baseMva', num(1, 1000, 1)),
      optional('baseKv', num(100, 800, 1)),
    ) as fc.Arbitrary<Base>,
    second: fc.boolean(),
  })
  .chain(({ circuits, base, second }) => {
    const sections = fc.array(
      fc.oneof({ weight: 4, arbitrary: overhead(circuits) }, { weight: 1, arbitrary: cable(circuits, base) }),
      {
        minLength: 1,
        maxLength: 3,
      },
    );
    // A line that names two circuits nowhere but in what is declared must declare the second.
    const entries = circuits === 2 ? [declared(1, base), declared(2, base)] : [declared(1, base)];
    const coupling =
      circuits === 2 && second
        ? [optional('x0m', quantity(X_UNITS, base)), optional('b0m', quantity(B_UNITS, base))]
        : [];
    return both(
      fc.record({
        name: text,
        from: text,
        to: text,
        nominalVoltageKv: num(60, 1200, 1),
        frequencyHz: fc.constantFrom(50, 60),
        sections,
      }),
      optional('transposed', fc.boolean()),
      fc.tuple(...entries).map((d) => ({ declared: d })),
      both(...coupling).map((m) =>
        Object.keys(m).length ? { declaredMutual: [{ circuits: [1, 2], ...m }] } : {},
      ),
    );
  });

/** The text of a filing of one to four lines, each with a name of its own. */
export const filingText: fc.Arbitrary<string> = fc
  .array(line, { minLength: 1, maxLength: 4 })
  .map((lines) => {
    const named = lines.map((l, i) => ({ ...l, name: `${String(l['name'])} ${i + 1}` }));
    const marked = JSON.stringify({ lines: named }, (_key, v: unknown) =>
      v instanceof Digits ? `\u0001${v.text}\u0001` : v,
    );
    return marked.replace(/"\\u0001([^"\\]*)\\u0001"/g, '$1');
  });
