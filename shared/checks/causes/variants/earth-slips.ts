import { figure, withUnit } from '../../words';
import type { Outcome } from '../bench';
import { fitOne, gridOf } from './fit-one';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, overheadSections } from './variant';

/** Resistivities that people assume, Ω·m. */
const ASSUMED_OHM_M = [
  5, 10, 20, 25, 30, 50, 100, 150, 200, 250, 300, 400, 500, 600, 800, 1000, 1500, 2000, 3000, 5000, 10_000,
] as const;

/** What a fitted resistivity may be, Ω·m. */
const FITTED_OHM_M = [0.5, 1e5] as const;

/** What a fitted multiple of every section’s resistivity may be. */
const FITTED_FACTORS = [0.02, 50] as const;

/**
 * Another earth resistivity: each that people assume, and the one that the declared X0 (or R0) itself would need.
 *
 * @param violated true for the constants that are beyond tolerance on any circuit
 */
export function earthSlips(context: VariantContext, violated: ReadonlySet<string>): Variant[] {
  if (!['r0', 'x0', 'r0m', 'x0m'].some((parameter) => violated.has(parameter))) return [];
  const filed = new Set(overheadSections(context).map(({ section }) => section.earthResistivityOhmM));
  const solve = (ohmM: number): Outcome | null =>
    context.bench.changed((section) => ({ ...section, earthResistivityOhmM: ohmM }));
  const make = (ohmM: number, freedom: number, prior: number): Variant[] => {
    const outcome = solve(ohmM);
    const words = (): string => `the earth resistivity was taken as ${withUnit(ohmM, 'Ω·m')}`;
    const common = { code: 'earth-resistivity', in: 'declared', model: ENGINE_MODEL } as const;
    return outcome === null ? [] : [{ ...common, outcome, prior, freedom, words }];
  };
  const fitted = fittedTo(context, solve, FITTED_OHM_M);
  const assumed = ASSUMED_OHM_M.filter((ohmM) => !(filed.size === 1 && filed.has(ohmM)));
  return [
    ...(filed.size > 1 ? commonFactor(context) : []),
    ...assumed
      .filter((ohmM) => couldFit(ohmM, fitted))
      .flatMap((ohmM) => make(ohmM, 0, -0.5 - Math.log(assumed.length))),
    ...(fitted ?? []).flatMap((ohmM) => make(ohmM, 1, -2)),
  ];
}

/** Sections of different earth, each taken as the same multiple of what it is filed with. */
function commonFactor(context: VariantContext): Variant[] {
  const solve = (factor: number): Outcome | null =>
    context.bench.changed((section) => ({
      ...section,
      earthResistivityOhmM: section.earthResistivityOhmM * factor,
    }));
  const common = { code: 'earth-resistivity', in: 'declared', model: ENGINE_MODEL } as const;
  const roots = fittedTo(context, solve, FITTED_FACTORS) ?? [];
  return roots.flatMap((factor): Variant[] => {
    const outcome = solve(factor);
    const words = (): string =>
      `every section’s earth resistivity was taken as ${figure(factor)} times as much`;
    return outcome === null ? [] : [{ ...common, outcome, prior: -2.5, freedom: 1, words }];
  });
}

/** A resistivity this far (in ln ρ) from what X0 needs is more than the tight tolerance away from it. */
const NEAR = 0.5;

function couldFit(ohmM: number, fitted: readonly number[] | null): boolean {
  return fitted === null || fitted.some((root) => Math.abs(Math.log(ohmM / root)) < NEAR);
}

/** The resistivities (or multiples) that the declared X0 of each circuit needs; null when none is declared. */
function fittedTo(
  context: VariantContext,
  solve: (ohmM: number) => Outcome | null,
  [low, high]: readonly [number, number],
): number[] | null {
  if (context.declared.every((declared) => declared?.x0 === undefined)) return null;
  return context.declared.flatMap((declared, circuit) => {
    const wanted = declared?.x0;
    if (wanted === undefined || wanted <= 0) return [];
    return fitOne(
      (ohmM) => {
        const value = solve(ohmM)?.circuits[circuit]?.x0;
        return value === undefined ? null : value / wanted - 1;
      },
      gridOf(low, high, 5, true),
      7,
    );
  });
}
