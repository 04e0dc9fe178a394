import { EPSILON_0 } from '../../../engine/constants';
import type { OverheadSection } from '../../../engine/index';
import { withUnit } from '../../words';
import type { Outcome } from '../bench';
import type { DeclaredParameter, Values } from '../problem';
import { isShunt } from '../problem';
import { spacingOf } from './spacing';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, SHORTCUT_MODEL, changePhases, overheadSections } from './variant';

/** The other rated frequency. */
export function frequencySlip({ bench }: VariantContext): Variant[] {
  const other = bench.line.frequencyHz === 60 ? 50 : 60;
  const outcome = bench.changed(() => null, other);
  if (outcome === null) return [];
  const words = `the value is for ${withUnit(other, 'Hz')}`;
  return [
    { code: 'frequency', in: 'declared', outcome, prior: -0.3, model: ENGINE_MODEL, freedom: 0, words },
  ];
}

/** Values of one kind standing in the field of another, where the other field does not tell. */
export function misplacedSlips({ base }: VariantContext): Variant[] {
  const make = (
    code: Variant['code'],
    pairs: readonly (readonly [DeclaredParameter, DeclaredParameter])[],
    words: string,
  ): Variant => {
    const circuits = base.circuits.map((values): Values => {
      const moved: Values = { ...values };
      for (const [one, other] of pairs) {
        if (values[other] !== undefined) moved[one] = values[other];
        if (values[one] !== undefined) moved[other] = values[one];
      }
      return moved;
    });
    const outcome: Outcome = { circuits, pairs: base.pairs };
    return { code, in: 'declared', outcome, prior: -1.5, model: ENGINE_MODEL, freedom: 0, words };
  };
  return [
    make(
      'sequence-swapped',
      [
        ['r1', 'r0'],
        ['x1', 'x0'],
        ['b1', 'b0'],
      ],
      'it is the value of the other sequence',
    ),
    make(
      'r-x-swapped',
      [
        ['r1', 'x1'],
        ['r0', 'x0'],
      ],
      'R and X stand in each other’s place',
    ),
  ];
}

/** Ground wires left out, or taken as carrying no current. */
export function groundWireSlips({ bench }: VariantContext): Variant[] {
  const has = (section: OverheadSection): boolean =>
    section.positions.some(({ kind }) => kind === 'ground-wire');
  const without = bench.changed((section) =>
    has(section) ? { ...section, positions: section.positions.filter(({ kind }) => kind === 'phase') } : null,
  );
  const idle = bench.changed((section) =>
    has(section) && section.groundWireBonding === 'continuous'
      ? { ...section, groundWireBonding: 'segmented' }
      : null,
  );
  return [
    ...wireVariants(without, -0.5, 'the ground wires were left out'),
    ...wireVariants(idle, -2, 'the ground wires were taken as carrying no current'),
  ];
}

/** Left out of everything, or of the zero sequence alone, which is where they matter. */
function wireVariants(outcome: Outcome | null, prior: number, words: string): Variant[] {
  if (outcome === null) return [];
  const common = {
    code: 'no-ground-wires',
    in: 'declared',
    model: ENGINE_MODEL,
    freedom: 0,
    outcome,
    words,
  } as const;
  const isZero = (parameter: DeclaredParameter): boolean => parameter.includes('0');
  return [
    { ...common, isWhole: true, prior },
    { ...common, reach: isZero, prior: prior - 0.3 },
  ];
}

/** Attachment heights used as mean heights. */
export function towerHeightSlip({ bench }: VariantContext): Variant[] {
  const outcome = bench.changed((section) =>
    section.positions.some(({ sagM }) => sagM > 0)
      ? { ...section, positions: section.positions.map((position) => ({ ...position, sagM: 0 })) }
      : null,
  );
  const phasesOnly = bench.changed(
    changePhases((position) => (position.sagM > 0 ? { ...position, sagM: 0 } : null)),
  );
  const common = {
    code: 'tower-height',
    in: 'declared',
    model: ENGINE_MODEL,
    freedom: 0,
    words: 'the height at the tower was used in place of the mean height',
  } as const;
  return [
    ...(outcome === null ? [] : [{ ...common, outcome, prior: -0.5 }]),
    ...(phasesOnly === null ? [] : [{ ...common, outcome: phasesOnly, prior: -1.5 }]),
  ];
}

/** Arithmetic in place of geometric mean spacing, in the formulas of a transposed line. */
export function arithmeticSpacingSlip(context: VariantContext): Variant[] {
  const { bench, base } = context;
  const omega = 2 * Math.PI * bench.line.frequencyHz;
  const ohmPerKm = omega * 2e-4;
  const microsiemens = omega * 2 * Math.PI * EPSILON_0 * 1e9;
  const circuits = base.circuits.map((values, circuit): Values => {
    let shift = 0;
    for (const { section } of overheadSections(context)) {
      const spacing = spacingOf(section, circuit + 1);
      if (spacing === null) continue;
      shift += Math.log(spacing.arithmeticM / spacing.geometricM) * (section.lengthKm / bench.lengthKm);
    }
    const { x1, b1 } = values;
    return {
      ...values,
      ...(x1 === undefined ? {} : { x1: x1 + ohmPerKm * shift }),
      ...(b1 === undefined ? {} : { b1: microsiemens / (microsiemens / b1 + shift) }),
    };
  });
  return [
    {
      code: 'arithmetic-spacing',
      in: 'declared',
      outcome: { circuits, pairs: base.pairs },
      prior: -0.7,
      model: SHORTCUT_MODEL / 3,
      freedom: 0,
      words: 'the arithmetic mean spacing was used in place of the geometric one',
    },
  ];
}

const PI_KEYS = { r1: 'r', x1: 'x', b1: 'b', r0: 'r0', x0: 'x0', b0: 'b0' } as const;

/** The whole line's equivalent pi, or its ABCD parameters, divided by its length in place of per-length values. */
export function longLineSlips({ base, constants }: VariantContext): Variant[] {
  const forms = constants.equivalent.map((pi): Values => {
    const perKm: Values = {};
    for (const [key, name] of Object.entries(PI_KEYS)) {
      perKm[key as DeclaredParameter] = pi[name] / constants.lengthKm;
    }
    return perKm;
  });
  const parameters = base.circuits.map((values, circuit): Values => {
    const series = (forms[circuit]?.x1 ?? 0) / (values.x1 ?? 1);
    const zero = (forms[circuit]?.x0 ?? 0) / (values.x0 ?? 1);
    return { ...values, b1: (values.b1 ?? 0) * series, b0: (values.b0 ?? 0) * zero };
  });
  const make = (circuits: Values[], prior: number, words: string, reach?: Variant['reach']): Variant => {
    const outcome: Outcome = { circuits, pairs: base.pairs };
    const common = { code: 'long-line-form', in: 'declared', model: 3e-4, freedom: 0 } as const;
    return { ...common, outcome, prior, words, ...(reach === undefined ? {} : { reach }) };
  };
  return [
    make(forms, -0.5, 'it is the equivalent pi of the whole line divided by its length'),
    make(
      parameters,
      -2,
      'it is the shunt parameter of the whole line’s two-port divided by its length',
      isShunt,
    ),
  ];
}
