import { figure, withUnit } from '../../words';
import type { OverheadSection, PhasePosition } from '../../../engine/index';
import type { Outcome } from '../bench';
import { fitOne, gridOf } from './fit-one';
import { gmrOf } from './gmr-of';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, changePhases, overheadSections, sectionPointer } from './variant';

/** Sides of bundles that are built, m. */
const BUILT_SIDES_M = [0.2, 0.25, 0.3, 0.3048, 0.35, 0.375, 0.4, 0.45, 0.4572, 0.5, 0.55, 0.6] as const;

/** Subconductors of bundles that are built. */
const BUILT_COUNTS = [2, 3, 4, 6] as const;

/** Ways in which a side is mistaken for another length: half, diagonal, inches. */
const SIDE_FACTORS = [0.5, 2, Math.SQRT2, Math.SQRT1_2, 0.0254] as const;

const MOST = 8;

/**
 * Another number of subconductors, or another side of the bundle, in every section.
 *
 * @param context the line
 * @param withSides whether another side could explain anything: it moves X1 and 1/B1 together
 */
export function bundleSlips(context: VariantContext, withSides: boolean): Variant[] {
  const filed = filedBundle(context);
  if (filed === null) return [];
  return filed.bundleCount === 1
    ? withSides
      ? bundleForSingle(context, filed)
      : []
    : [...countSlips(context, filed), ...(withSides ? sideSlips(context, filed) : [])];
}

interface Filed {
  position: PhasePosition;
  where: string;
  bundleCount: number;
  sideM: number;
  /** Phases of one section have different sides: none of them is to be trusted. */
  isMixed: boolean;
}

function filedBundle(context: VariantContext): Filed | null {
  for (const { section, index } of overheadSections(context)) {
    const at = section.positions.findIndex(({ kind }) => kind === 'phase');
    const position = section.positions[at];
    if (position?.kind !== 'phase') continue;
    const where = `${sectionPointer(context, index)}/positions/${at}`;
    return {
      position,
      where,
      bundleCount: position.bundleCount,
      sideM: position.bundleSpacingM,
      isMixed: hasMixedSides(section),
    };
  }
  return null;
}

function hasMixedSides({ positions }: OverheadSection): boolean {
  const sides = new Set(positions.flatMap((one) => (one.kind === 'phase' ? [one.bundleSpacingM] : [])));
  return sides.size > 1;
}

/**
 * The line with another number of subconductors and its sides scaled; a single conductor, and phases of one section
 * whose sides differ, get the side given.
 */
function solve(context: VariantContext, filed: Filed, bundleCount: number, side: number): Outcome | null {
  return context.bench.changed(
    changePhases((position) => {
      const isScaled = filed.sideM > 0 && !filed.isMixed;
      const own = isScaled ? (position.bundleSpacingM * side) / filed.sideM : side;
      return { ...position, bundleCount, bundleSpacingM: bundleCount === 1 ? 0 : own };
    }),
  );
}

const COMMON = { in: 'geometry', model: ENGINE_MODEL } as const;

function countSlips(context: VariantContext, filed: Filed): Variant[] {
  const counts = Array.from({ length: MOST }, (_, index) => index + 1).filter((n) => n !== filed.bundleCount);
  return counts.flatMap((bundleCount): Variant[] => {
    const outcome = solve(context, filed, bundleCount, filed.sideM);
    if (outcome === null) return [];
    const likely = bundleCount <= 4 ? -Math.log(3) : -Math.log(3) - 1.5;
    const words = (): string =>
      `each phase has ${bundleCount} subconductor${bundleCount === 1 ? '' : 's'}, not ${filed.bundleCount}`;
    return [
      {
        ...COMMON,
        code: 'bundle-count',
        outcome,
        prior: -0.7 + likely,
        freedom: 0,
        where: filed.where,
        corrected: { bundleCount },
        words,
      },
    ];
  });
}

function bundleForSingle(context: VariantContext, filed: Filed): Variant[] {
  return BUILT_COUNTS.flatMap((bundleCount) =>
    BUILT_SIDES_M.flatMap((side): Variant[] => {
      if (!couldFit(context, lnBundleGmr(filed, bundleCount, side) - lnBundleGmr(filed, 1, 0))) return [];
      const outcome = solve(context, filed, bundleCount, side);
      if (outcome === null) return [];
      const words = (): string =>
        `each phase has ${bundleCount} subconductors ${withUnit(side, 'm', 4)} apart, not one`;
      return [
        {
          ...COMMON,
          code: 'bundle-count',
          outcome,
          prior: -1 - Math.log(BUILT_COUNTS.length * BUILT_SIDES_M.length),
          freedom: 0,
          where: filed.where,
          corrected: { bundleCount, bundleSpacingM: side },
          words,
        },
      ];
    }),
  );
}

function sideSlips(context: VariantContext, filed: Filed): Variant[] {
  const make = (side: number, freedom: number, prior: number): Variant[] => {
    const outcome = solve(context, filed, filed.bundleCount, side);
    if (outcome === null) return [];
    const words = (): string =>
      filed.isMixed
        ? `every bundle’s side is ${withUnit(side, 'm', 4)}`
        : `the bundle’s side is ${withUnit(side, 'm', 4)}, not ${withUnit(filed.sideM, 'm', 4)}`;
    return [
      {
        ...COMMON,
        code: 'bundle-spacing',
        outcome,
        prior,
        freedom,
        where: filed.where,
        corrected: { bundleSpacingM: Number(side.toPrecision(6)) },
        words,
      },
    ];
  };
  const known = [...BUILT_SIDES_M, ...SIDE_FACTORS.map((factor) => factor * filed.sideM)];
  const isOther = (side: number): boolean =>
    (filed.isMixed || (Math.abs(side / filed.sideM - 1) > 0.01 && !isOtherUnit(side / filed.sideM))) &&
    side > 0.02 &&
    side < 5;
  const others = known.filter(isOther);
  const isNear = (side: number): boolean => filed.isMixed || couldFit(context, lnShift(filed, side));
  return [
    ...others
      .filter(isNear)
      .flatMap((side) => make(side, 0, -1 - Math.log(others.length) + likelihood(side, filed))),
    ...fittedSides(context, filed)
      .filter(isOther)
      .flatMap((side) => make(side, 1, -2.5 + likelihood(side, filed))),
  ];
}

/** A ratio that is centimetres taken as metres: no side is mistaken by so much. */
function isOtherUnit(ratio: number): boolean {
  return Math.abs(ratio / 0.01 - 1) < 0.05;
}

/** Log price of a ratio that is feet taken as metres: it stands behind the slip with that code. */
function feetPrice(ratio: number): number {
  return Math.abs(ratio / 0.3048 - 1) < 0.05 ? -4 : 0;
}

/** Log price of taking a side for another: a side as built is rarely wrong, odd or mixed ones rarely right. */
function likelihood(side: number, { sideM, isMixed }: Filed): number {
  const isBuilt = (metres: number): boolean => metres >= 0.28 && metres <= 0.62;
  const ofFiled = isMixed ? 2 : isBuilt(sideM) ? -1.5 : 0.7;
  return ofFiled + (isBuilt(side) ? 0 : -2) + (isMixed ? 0 : feetPrice(side / sideM));
}

/** Room that the quick look leaves beside the tight tolerance. */
const QUICK_LOOK = 0.03;

/** True when a change of ln(GMR of the bundle) brings some declared X1 near, before the engine is asked. */
function couldFit({ base, bench, declared }: VariantContext, lnGmrShift: number): boolean {
  const ohmPerKm = 2 * Math.PI * bench.line.frequencyHz * 2e-4;
  return base.circuits.some(({ x1 }, circuit) => {
    const wanted = declared[circuit]?.x1;
    return (
      wanted === undefined ||
      x1 === undefined ||
      Math.abs((x1 - ohmPerKm * lnGmrShift) / wanted - 1) < QUICK_LOOK
    );
  });
}

/** What another side adds to ln(GMR of the bundle). */
function lnShift({ bundleCount, sideM }: Filed, side: number): number {
  return ((bundleCount - 1) / bundleCount) * Math.log(side / sideM);
}

/** ln of the product of the distances from one subconductor to the others, in sides: square and hexagon. */
const LN_DISTANCES: Readonly<Record<number, number>> = { 4: Math.log(2) / 2, 6: Math.log(6) };

/** ln(GMR) of a bundle as built, in ln m. */
function lnBundleGmr({ position }: Filed, bundleCount: number, side: number): number {
  const lnOne = Math.log(gmrOf(position.conductor) / 1000);
  if (bundleCount === 1) return lnOne;
  const lnDistances = LN_DISTANCES[bundleCount] ?? 0;
  return (lnOne + (bundleCount - 1) * Math.log(side) + lnDistances) / bundleCount;
}

/** The side that the declared X1 itself would need. */
function fittedSides(context: VariantContext, filed: Filed): number[] {
  const circuit = context.declared.findIndex((declared) => declared?.x1 !== undefined);
  const wanted = context.declared[circuit]?.x1;
  if (wanted === undefined || wanted <= 0) return [];
  const roots = fitOne(
    (side) => {
      const value = solve(context, filed, filed.bundleCount, side)?.circuits[circuit]?.x1;
      return value === undefined ? null : value / wanted - 1;
    },
    gridAround(context, filed, wanted, circuit),
    5,
  );
  return roots.filter(
    (side) => Math.abs(side / filed.sideM - 1) > 0.01 && figure(side) !== figure(filed.sideM),
  );
}

/** Where to look for a side: around what the change of X1 says, or everywhere. */
function gridAround(context: VariantContext, filed: Filed, wanted: number, circuit: number): number[] {
  const x1 = context.base.circuits[circuit]?.x1;
  if (x1 === undefined || filed.isMixed) return gridOf(0.05, 3, 5, true);
  const ohmPerKm = 2 * Math.PI * context.bench.line.frequencyHz * 2e-4;
  const share = (filed.bundleCount - 1) / filed.bundleCount;
  const guess = filed.sideM * Math.exp((x1 - wanted) / (ohmPerKm * share));
  return guess > 0.02 && guess < 5 ? [guess * 0.8, guess * 1.25] : [];
}
