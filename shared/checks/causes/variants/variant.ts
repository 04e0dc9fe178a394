import type { ConductorData, OverheadSection, PhasePosition } from '../../../engine/index';
import type { LineConstants } from '../../../engine/index';
import type { NormalisedLine } from '../../../filing/types';
import type { LibraryConductor } from '../../../library/types';
import type { CauseCode } from '../../types';
import type { Bench, Outcome, SectionChange } from '../bench';
import type { Words } from '../item';
import type { DeclaredParameter } from '../problem';

/** Another way in which the values could have been worked out, or the geometry meant. */
export interface Variant {
  code: CauseCode;
  in: 'declared' | 'geometry';
  /** What it gives. */
  outcome: Outcome;
  /** Constants that it can reach; all when absent. */
  reach?: (parameter: DeclaredParameter) => boolean;
  /** Made in everything that it moves, never in a part of it. */
  isWhole?: true;
  prior: number;
  /** Spread of its own model, a share. */
  model: number;
  /** Numbers fitted to the declared values. */
  freedom: number;
  /** Place of a slip in the geometry. */
  where?: string;
  /** The corrected entries of a slip in the geometry, named from `where`. */
  corrected?: Readonly<Record<string, number>>;
  words: Words;
}

/** What variants are made from. */
export interface VariantContext {
  line: NormalisedLine;
  bench: Bench;
  base: Outcome;
  constants: LineConstants;
  library: readonly LibraryConductor[];
  /** Declared values by circuit index; a circuit without an entry has none. */
  declared: readonly (Partial<Record<DeclaredParameter, number>> | undefined)[];
}

/** Another engine with the same physics parts from ours by no more than this. */
export const ENGINE_MODEL = 2e-5;

/** A shortcut formula parts from the matrices by about this. */
export const SHORTCUT_MODEL = 1.5e-3;

/** Changes every phase position of a section; null when none changes. */
export function changePhases(change: (position: PhasePosition) => PhasePosition | null): SectionChange {
  return (section) => {
    let touched = false;
    const positions = section.positions.map((position) => {
      const other = position.kind === 'phase' ? change(position) : null;
      if (other === null) return position;
      touched = true;
      return other;
    });
    return touched ? { ...section, positions } : null;
  };
}

/** Changes the conductor of every phase position. */
export function changeConductors(change: (conductor: ConductorData) => ConductorData | null): SectionChange {
  return changePhases((position) => {
    const conductor = change(position.conductor);
    return conductor === null ? null : { ...position, conductor };
  });
}

/** The overhead sections of a line with their index. */
export function overheadSections(context: VariantContext): { section: OverheadSection; index: number }[] {
  return context.bench.line.sections.flatMap((section, index) =>
    section.kind === 'overhead' ? [{ section, index }] : [],
  );
}

/** JSON Pointer of a section. */
export function sectionPointer(context: VariantContext, index: number): string {
  return context.line.sections[index]?.pointer ?? context.line.pointer;
}
