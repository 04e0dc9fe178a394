import { EPSILON_0, MU_0, SAG_SHARE } from './constants';
import { dcResistanceOhmPerKm } from './conductor';
import { fail, succeed } from './failures';
import { bundleOffsets } from './wires';
import { solveSection } from './section';
import type { ConductorData, OverheadSection, PhasePosition, Result } from './types';

/** Why the textbook shortcut and the full method part, in the order in which the causes are taken up. */
export type ShortcutCause = 'bundle' | 'earth' | 'ground-wires' | 'other-circuits';

/** One value by the shortcut and by the full method, with the difference split by cause (the parts add up to it). */
export interface ShortcutValue {
  shortcut: number;
  full: number;
  /** full − shortcut, in the value's unit. */
  difference: number;
  causes: { cause: ShortcutCause; difference: number }[];
}

/** The textbook shortcut with every intermediate value that a reader with a calculator meets. */
export interface HandCheck {
  circuit: number;
  frequencyHz: number;
  /** Distances between the bundles' centres at average height, m. */
  spacingsM: { ab: number; bc: number; ca: number };
  /** Geometric mean distance ∛(ab·bc·ca), m. */
  gmdM: number;
  bundleCount: number;
  bundleSpacingM: number;
  /** Product of the distances from one subconductor to the others of its bundle, m^(n−1); 1 for a single conductor. */
  bundleProduct: number;
  /** Outer radius r and GMR of one subconductor, m. */
  radiusM: number;
  gmrM: number;
  /** Where the GMR comes from: tabled, or r·e^(−¼) of a solid wire for lack of it. */
  gmrSource: 'tabled' | 'solid-wire';
  /** Bundle's GMR for L and equivalent radius for C: ⁿ√(GMR·product) and ⁿ√(r·product), m. */
  bundleGmrM: number;
  bundleRadiusM: number;
  /** (μ₀/2π)·ln(GMD/GMR_b), mH/km. */
  inductanceMilliHenryPerKm: number;
  /** 2πε₀/ln(GMD/r_b), nF/km. */
  capacitanceNanofaradPerKm: number;
  /** R/n, ωL and ωC beside the full method: Ω/km, Ω/km, µS/km. */
  r1: ShortcutValue;
  x1: ShortcutValue;
  b1: ShortcutValue;
}

/** How far the circuit is lifted so that neither earth nor images are felt, m. */
const FAR_AWAY_M = 50_000;

/** Product of the distances from one subconductor to the others of its polygon, m^(n−1). */
export function bundleProduct(count: number, spacingM: number): number {
  const xy = bundleOffsets(count, spacingM);
  let product = 1;
  for (let i = 2; i < xy.length; i += 2) {
    product *= Math.hypot((xy[i] ?? 0) - (xy[0] ?? 0), (xy[i + 1] ?? 0) - (xy[1] ?? 0));
  }
  return product;
}

/** GMR of one conductor in m, by table or as a solid wire's r·e^(−¼). */
function conductorGmr(c: ConductorData): { gmrM: number; source: 'tabled' | 'solid-wire' } {
  if (c.gmrMm !== undefined && c.gmrMm > 1e-9 && c.gmrMm < 1e6)
    return { gmrM: c.gmrMm / 1000, source: 'tabled' };
  return { gmrM: (c.diameterMm / 2000) * Math.exp(-0.25), source: 'solid-wire' };
}

/** Distance of two bundles' centres at average height, m. */
function distance(p: PhasePosition, q: PhasePosition): number {
  const dy = p.attachmentHeightM - q.attachmentHeightM - SAG_SHARE * (p.sagM - q.sagM);
  return Math.hypot(p.horizontalM - q.horizontalM, dy);
}

/** The three phases of one circuit in the order a, b, c. */
function phasesOf(s: OverheadSection, circuit: number): [PhasePosition, PhasePosition, PhasePosition] | null {
  const find = (phase: string): PhasePosition | undefined =>
    s.positions.find(
      (p): p is PhasePosition => p.kind === 'phase' && p.circuit === circuit && p.phase === phase,
    );
  const [a, b, c] = [find('a'), find('b'), find('c')];
  return a && b && c ? [a, b, c] : null;
}

/** Positive-sequence values of a variant of the section, for the circuit that has become its first. */
function variant(
  s: OverheadSection,
  frequencyHz: number,
  index: number,
): { r1: number; x1: number; b1: number } | null {
  const result = solveSection(s, frequencyHz);
  return result.ok ? (result.value.circuits[index] ?? null) : null;
}

/** The circuit alone, lifted far away from the earth; alone above it; with the ground wires. */
function variants(s: OverheadSection, phases: readonly PhasePosition[]): OverheadSection[] {
  const alone = phases.map((p) => ({ ...p, circuit: 1 }));
  // So high up the images are felt with (spacing/2h)², some 1e−9, and an earth that conducts well adds nothing.
  const lifted = alone.map((p) => ({ ...p, attachmentHeightM: p.attachmentHeightM + FAR_AWAY_M }));
  const wires = s.positions.filter((p) => p.kind === 'ground-wire');
  return [
    { ...s, positions: lifted, earthResistivityOhmM: 1e-6 },
    { ...s, positions: alone },
    { ...s, positions: [...alone, ...wires] },
  ];
}

/** The chain's steps: each variant differs from the one before by one cause. */
const CAUSES: readonly ShortcutCause[] = ['bundle', 'earth', 'ground-wires', 'other-circuits'];

/** Splits full − shortcut along the chain of variants. */
function compare(shortcut: number, chain: readonly number[]): ShortcutValue {
  const full = chain[chain.length - 1] ?? shortcut;
  return {
    shortcut,
    full,
    difference: full - shortcut,
    causes: CAUSES.map((cause, i) => ({
      cause,
      difference: (chain[i] ?? full) - (chain[i - 1] ?? shortcut),
    })),
  };
}

/**
 * Positive-sequence constants by the GMD/GMR shortcut of the textbooks (transposed line, no earth, no ground wires),
 * with each intermediate value, and how far that is from the full method and why. Never the value that is judged.
 * Where phases differ in bundle or conductor, phase a's stand for all and the rest shows under `bundle`.
 *
 * Source: the derivations in Glover/Sarma/Overbye ch. 4 and Grainger & Stevenson ch. 4–5.
 *
 * @param s the section
 * @param frequencyHz frequency, Hz
 * @param circuit circuit number, from 1
 * @returns the hand check, or the typed failure of the full method
 */
export function handCheck(s: OverheadSection, frequencyHz: number, circuit: number): Result<HandCheck> {
  const complete = solveSection(s, frequencyHz);
  if (!complete.ok) return complete;
  const full = complete.value.circuits[circuit - 1];
  const phases = phasesOf(s, circuit);
  if (!full || !phases) return fail('missing-phase', {}, `the section has no circuit ${circuit}`);
  const omega = 2 * Math.PI * frequencyHz;
  const [a, b, c] = phases;
  const spacingsM = { ab: distance(a, b), bc: distance(b, c), ca: distance(c, a) };
  const gmdM = Math.cbrt(spacingsM.ab * spacingsM.bc * spacingsM.ca);
  const { gmrM, source } = conductorGmr(a.conductor);
  const radiusM = a.conductor.diameterMm / 2000;
  const product = bundleProduct(a.bundleCount, a.bundleSpacingM);
  const bundleGmrM = (gmrM * product) ** (1 / a.bundleCount);
  const bundleRadiusM = (radiusM * product) ** (1 / a.bundleCount);
  const henryPerM = (MU_0 / (2 * Math.PI)) * Math.log(gmdM / bundleGmrM);
  const faradPerM = (2 * Math.PI * EPSILON_0) / Math.log(gmdM / bundleRadiusM);
  const resistance =
    a.conductor.model === 'tube'
      ? dcResistanceOhmPerKm(a.conductor)
      : (a.conductor.acResistanceOhmPerKm ?? 0);
  const chain = [...variants(s, phases).map((v) => variant(v, frequencyHz, 0) ?? full), full];
  return succeed({
    circuit,
    frequencyHz,
    spacingsM,
    gmdM,
    bundleCount: a.bundleCount,
    bundleSpacingM: a.bundleSpacingM,
    bundleProduct: product,
    radiusM,
    gmrM,
    gmrSource: source,
    bundleGmrM,
    bundleRadiusM,
    inductanceMilliHenryPerKm: henryPerM * 1e6,
    capacitanceNanofaradPerKm: faradPerM * 1e12,
    r1: compare(
      resistance / a.bundleCount,
      chain.map((v) => v.r1),
    ),
    x1: compare(
      1000 * omega * henryPerM,
      chain.map((v) => v.x1),
    ),
    b1: compare(
      1e9 * omega * faradPerM,
      chain.map((v) => v.b1),
    ),
  });
}
