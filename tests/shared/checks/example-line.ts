import { checkLine } from '#shared/checks/check-line';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import type { RuleSet } from '#shared/checks/rule-set';
import type { CheckOptions, Finding, LineReport } from '#shared/checks/types';
import { readFiling } from '#shared/filing/read-filing';
import type { NormalisedLine } from '#shared/filing/types';
import { STARTING_LIBRARY } from '#shared/library/conductors';

/** A filing line as JSON, loose enough to be spoilt in any way. */
// eslint-disable-next-line @typescript-eslint/no-explicit-any
export type Json = any;

const bundle = { bundleCount: 2, bundleSpacingM: 0.4572 };

const phase = (name: string, horizontalM: number): Json => ({
  circuit: 1,
  phase: name,
  conductor: 'phase',
  horizontalM,
  attachmentHeightM: 24,
  sagM: 9,
  ...bundle,
});

const perKm = (unit: string) => (value: number) => ({ value, unit });
const ohm = perKm('ohm/km');
const micro = perKm('uS/km');

/**
 * The example of the filing format, with honest values: 345 kV, flat, two Drake a phase, two steel ground wires. The
 * figures were computed apart from the product with 34-digit arithmetic.
 */
export function exampleLine(change: (line: Json) => void = () => undefined): Json {
  const line: Json = {
    name: 'Harrow Fell – Sarn',
    from: 'Harrow Fell',
    to: 'Sarn',
    nominalVoltageKv: 345,
    frequencyHz: 60,
    sections: [
      {
        kind: 'overhead',
        lengthKm: 42.5,
        earthResistivityOhmM: 100,
        groundWireBonding: 'continuous',
        conductors: {
          phase: {
            name: 'Drake',
            model: 'handbook',
            diameterMm: 28.14,
            coreDiameterMm: 10.36,
            gmrMm: 11.37,
            acResistanceOhmPerKm: 0.0798,
            dcResistance20OhmPerKm: 0.0702,
            temperatureC: 50,
          },
          ground: {
            name: '3/8 in steel',
            model: 'handbook',
            diameterMm: 9.14,
            gmrMm: 1,
            acResistanceOhmPerKm: 4,
          },
        },
        positions: [
          phase('a', -9),
          phase('b', 0),
          phase('c', 9),
          { groundWire: true, conductor: 'ground', horizontalM: -6.5, attachmentHeightM: 30, sagM: 7 },
          { groundWire: true, conductor: 'ground', horizontalM: 6.5, attachmentHeightM: 30, sagM: 7 },
        ],
      },
    ],
    declared: [
      {
        circuit: 1,
        r1: ohm(0.040384),
        x1: ohm(0.381199),
        b1: micro(4.34727),
        r0: ohm(0.334418),
        x0: ohm(1.270916),
        b0: micro(2.82739),
      },
    ],
  };
  change(line);
  return line;
}

/** A line without geometry, to which physics and bands alone apply. */
export function bareLine(kv: number, hz: 50 | 60, declared: Record<string, number>, lengthKm = 50): Json {
  return exampleLine((line) => {
    line.nominalVoltageKv = kv;
    line.frequencyHz = hz;
    line.sections = [{ kind: 'overhead', lengthKm, earthResistivityOhmM: 100 }];
    const entries = Object.entries(declared).map(([key, value]) => [
      key,
      key.startsWith('b') ? micro(value) : ohm(value),
    ]);
    line.declared = [{ circuit: 1, ...Object.fromEntries(entries) }];
  });
}

/** Reads lines as the product does; a fault is an error of the test. */
export function read(...lines: Json[]): readonly NormalisedLine[] {
  const result = readFiling(
    { format: 'filing/1', lines },
    { library: STARTING_LIBRARY, owner: DEFAULT_RULE_SET.owner },
  );
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.filing.lines;
}

/** Checks one line. */
export function check(line: Json, options?: CheckOptions, rules: RuleSet = DEFAULT_RULE_SET): LineReport {
  const [one] = read(line);
  if (one === undefined) throw new Error('nothing was read');
  return checkLine(one, rules, options);
}

/** Every finding of a report. */
export function findings(report: LineReport): Finding[] {
  return [...report.circuits.flatMap((circuit) => circuit.findings), ...report.findings];
}

/** The findings that ask for something. */
export function questions(report: LineReport): Finding[] {
  return findings(report).filter(({ grade }) => grade !== 'note');
}

/** Two vertical circuits 14 m apart with their coupling declared. */
export function doubleLine(change: (line: Json) => void = () => undefined): Json {
  return exampleLine((line) => {
    const [first] = line.sections[0].positions;
    line.sections[0].positions = [1, 2].flatMap((circuit) =>
      ['a', 'b', 'c'].map((phase, level) => ({
        ...first,
        circuit,
        phase,
        horizontalM: circuit === 1 ? -7 : 7,
        attachmentHeightM: 24 + 9 * level,
      })),
    );
    delete line.sections[0].conductors.ground;
    const report = check({ ...line, declared: [{ ...line.declared[0] }] });
    const values = report.circuits[0]?.recomputed;
    const [pair] = report.mutual;
    if (values === null || values === undefined || pair === undefined) throw new Error('no values');
    const entry = (circuit: number) => ({
      circuit,
      ...Object.fromEntries(
        (['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const).map((key) => [
          key,
          { value: values[key], unit: key.startsWith('b') ? 'uS/km' : 'ohm/km' },
        ]),
      ),
    });
    line.declared = [entry(1), entry(2)];
    line.declaredMutual = [
      {
        circuits: [1, 2],
        r0m: { value: pair.r0m, unit: 'ohm/km' },
        x0m: { value: pair.x0m, unit: 'ohm/km' },
        b0m: { value: pair.b0m, unit: 'uS/km' },
      },
    ];
    change(line);
  });
}
