import type { ConductorData, OverheadSection } from '../../../engine/index';
import type { Outcome, SectionChange } from '../bench';
import type { DeclaredParameter } from '../problem';
import { isResistance, isShunt } from '../problem';
import { gmrOf } from './gmr-of';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, changeConductors, changePhases } from './variant';

interface Recipe {
  code: Variant['code'];
  change: SectionChange;
  reach?: Variant['reach'];
  prior: number;
  model: number;
  words: string;
}

const isReactance = (parameter: DeclaredParameter): boolean =>
  !isShunt(parameter) && !isResistance(parameter);

const withGmr = (gmr: (conductor: ConductorData) => number): SectionChange =>
  // A tube's reactance comes from its own shape: only as a handbook conductor can it be given another GMR.
  changeConductors((conductor) => ({
    ...conductor,
    model: 'handbook',
    gmrMm: gmr(conductor),
    acResistanceOhmPerKm: conductor.acResistanceOhmPerKm ?? conductor.dcResistance20OhmPerKm ?? 0.1,
  }));

const RECIPES: readonly Recipe[] = [
  {
    code: 'radius-for-gmr',
    change: withGmr((conductor) => conductor.diameterMm / 2),
    reach: isReactance,
    prior: -0.5,
    model: ENGINE_MODEL,
    words: 'the radius was used in place of the GMR',
  },
  {
    code: 'diameter-for-radius',
    change: changeConductors((conductor) => ({ ...conductor, diameterMm: 2 * conductor.diameterMm })),
    reach: isShunt,
    prior: -0.7,
    model: ENGINE_MODEL,
    words: 'the diameter was used in place of the radius',
  },
  {
    // A tube's reactance and skin effect follow its diameter.
    code: 'diameter-for-radius',
    change: changeConductors((conductor) =>
      conductor.model === 'tube' ? { ...conductor, diameterMm: 2 * conductor.diameterMm } : null,
    ),
    prior: -1,
    model: ENGINE_MODEL,
    words: 'the diameter was used in place of the radius',
  },
  {
    code: 'gmr-for-radius',
    change: changeConductors((conductor) => ({
      ...conductor,
      diameterMm: 2 * gmrOf(conductor),
      coreDiameterMm: 0,
    })),
    reach: isShunt,
    prior: -0.7,
    model: ENGINE_MODEL,
    words: 'the GMR was used in place of the radius in the capacitance',
  },
  {
    code: 'single-conductor',
    change: changePhases((position) =>
      position.bundleCount === 1 ? null : { ...position, bundleCount: 1, bundleSpacingM: 0 },
    ),
    prior: -0.3,
    model: ENGINE_MODEL,
    words: 'one conductor was taken for the whole bundle',
  },
];

/** Diameter used as radius throughout: the GMR that was worked out from it is doubled too, three ways. */
const DOUBLED_GMR: readonly ((conductor: ConductorData) => number)[] = [
  (conductor) => 2 * gmrOf(conductor),
  (conductor) => 0.7788 * conductor.diameterMm,
  (conductor) => conductor.diameterMm,
];

const doubled: readonly Recipe[] = DOUBLED_GMR.map((gmr) => ({
  code: 'diameter-for-radius' as const,
  change: (section, index) => {
    const other = withGmr(gmr)(section, index);
    return other === null
      ? null
      : changeConductors((conductor) => ({ ...conductor, diameterMm: 2 * conductor.diameterMm }))(
          other,
          index,
        );
  },
  reach: (parameter: DeclaredParameter) => !isResistance(parameter),
  prior: -3.5,
  model: ENGINE_MODEL,
  words: 'the diameter was used in place of the radius, in the GMR too',
}));

/** Slips with radius, diameter, GMR and the number of subconductors. */
export function conductorSlips({ bench }: VariantContext): Variant[] {
  return [...RECIPES, ...doubled].flatMap(({ change, ...rest }) => {
    const outcome = bench.changed(change);
    return outcome === null ? [] : [{ ...rest, in: 'declared' as const, outcome, freedom: 0 }];
  });
}

interface ResistanceRecipe {
  code: 'dc-resistance' | 'resistance-at-20c';
  of: (conductor: ConductorData) => number | null;
  words: string;
}

const RESISTANCES: readonly ResistanceRecipe[] = [
  { code: 'dc-resistance', of: dcAtTemperature, words: 'it is the d.c. resistance' },
  { code: 'resistance-at-20c', of: acAt20, words: 'it is the resistance at 20\u2009°C' },
  {
    code: 'resistance-at-20c',
    of: (conductor) => conductor.dcResistance20OhmPerKm ?? null,
    words: 'it is the d.c. resistance at 20\u2009°C',
  },
];

/**
 * Resistance slips: d.c. for a.c., 20 °C for the operating temperature; each with what the ground wires add, and as the
 * catalogue value divided by the number of subconductors.
 */
export function resistanceSlips({ bench }: VariantContext): Variant[] {
  return RESISTANCES.flatMap((recipe) => {
    const alone = (section: OverheadSection): OverheadSection => ({
      ...section,
      positions: section.positions.filter(({ kind }) => kind === 'phase'),
    });
    const change = withResistance(recipe);
    return [
      ...resistanceVariant(recipe, bench.changed(change), 0),
      ...resistanceVariant(
        recipe,
        bench.changed((section, index) => {
          const other = change(section, index);
          return other === null ? null : alone(other);
        }),
        -0.7,
      ),
    ];
  });
}

function withResistance({ code, of }: ResistanceRecipe): SectionChange {
  return changeConductors((conductor) => {
    // A tube's resistance follows from its temperature, skin effect and all.
    if (conductor.model === 'tube' && code === 'resistance-at-20c') return { ...conductor, temperatureC: 20 };
    const resistance = of(conductor);
    if (resistance === null) return null;
    // Only resistance is read from this variant, so a tube may become a handbook conductor of the same size.
    return { ...conductor, model: 'handbook', gmrMm: gmrOf(conductor), acResistanceOhmPerKm: resistance };
  });
}

function resistanceVariant(
  { code, words }: ResistanceRecipe,
  outcome: Outcome | null,
  price: number,
): Variant[] {
  if (outcome === null) return [];
  return [
    {
      code,
      in: 'declared',
      outcome,
      reach: isResistance,
      prior: -0.6 + price,
      model: ENGINE_MODEL,
      freedom: 0,
      words,
    },
  ];
}

function dcAtTemperature(conductor: ConductorData): number | null {
  const { dcResistance20OhmPerKm: dc, temperatureC } = conductor;
  return dc === undefined || temperatureC === undefined
    ? null
    : dc * temperatureFactor(conductor, temperatureC);
}

function acAt20(conductor: ConductorData): number | null {
  const { acResistanceOhmPerKm: ac, temperatureC } = conductor;
  return ac === undefined || temperatureC === undefined
    ? null
    : ac / temperatureFactor(conductor, temperatureC);
}

function temperatureFactor(conductor: ConductorData, temperatureC: number): number {
  return 1 + (conductor.temperatureCoefficientPerK ?? 0.00403) * (temperatureC - 20);
}
