import type { ConductorData, GroundWirePosition, PhasePosition } from '../../../engine/types';
import type { NormalisedLine, NormalisedOverhead } from '../../../filing/types';

/** An overhead section with its index in the line. */
export interface PlacedSection {
  section: NormalisedOverhead;
  index: number;
}

/** A position with its index in its section. */
export interface Placed<T> {
  position: T;
  index: number;
}

/** The overhead sections that have positions. */
export function drawnSections(line: NormalisedLine): PlacedSection[] {
  return line.sections.flatMap((section, index) => (section.kind === 'overhead' ? [{ section, index }] : []));
}

/** The phase positions of a section. */
export function phasesOf(section: NormalisedOverhead): Placed<PhasePosition>[] {
  return section.input.positions.flatMap((position, index) =>
    position.kind === 'phase' ? [{ position, index }] : [],
  );
}

/** The ground wires of a section. */
export function groundWiresOf(section: NormalisedOverhead): Placed<GroundWirePosition>[] {
  return section.input.positions.flatMap((position, index) =>
    position.kind === 'ground-wire' ? [{ position, index }] : [],
  );
}

/** A conductor that a section uses, where it is first used. */
export interface UsedConductor {
  conductor: ConductorData;
  use: 'phase' | 'ground-wire';
  /** Index of the first position that uses it. */
  index: number;
}

/** Each conductor of a section once for each use. */
export function conductorsOf(section: NormalisedOverhead): UsedConductor[] {
  const found: UsedConductor[] = [];
  section.input.positions.forEach(({ conductor, kind }, index) => {
    if (!found.some((used) => used.use === kind && sameData(used.conductor, conductor))) {
      found.push({ conductor, use: kind, index });
    }
  });
  return found;
}

function sameData(one: ConductorData, other: ConductorData): boolean {
  if (one === other) return true;
  return (
    one.name === other.name &&
    one.model === other.model &&
    one.diameterMm === other.diameterMm &&
    one.gmrMm === other.gmrMm &&
    one.acResistanceOhmPerKm === other.acResistanceOhmPerKm &&
    one.dcResistance20OhmPerKm === other.dcResistance20OhmPerKm &&
    one.temperatureC === other.temperatureC
  );
}

/** JSON Pointer of a position. */
export function positionPointer(section: NormalisedOverhead, index: number): string {
  return `${section.pointer}/positions/${index}`;
}

/** "position 3 (phase c of circuit 1)", as sentences name it. */
export function positionWords(section: NormalisedOverhead, index: number): string {
  const position = section.input.positions[index];
  if (position === undefined) return `position ${index + 1}`;
  const what =
    position.kind === 'phase' ? `phase ${position.phase} of circuit ${position.circuit}` : 'a ground wire';
  return `position ${index + 1} (${what})`;
}

/** What a conductor is called: its name, or what it is used for. */
export function conductorWords(used: UsedConductor): string {
  return used.conductor.name ?? (used.use === 'phase' ? 'the phase conductor' : 'the ground wire');
}
