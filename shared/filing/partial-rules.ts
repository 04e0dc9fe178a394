/** The rules beyond the schema, for the parts of a faulty line that hold by themselves: one fault hides no other. */
import { pointerToken } from '../contracts/faults';
import type { PointerFault } from '../contracts/faults';
import type { Conductor, Section } from '../contracts/filing.generated';
import type { ConductorLibrary } from '../library/types';
import { libraryFaults } from './library-resolve';
import { sectionRuleFaults } from './line-rules';

/** Whether a value is a JSON object and no list. */
export const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * Whether nothing at or below a place is at fault.
 * @param pointer JSON Pointer of the place
 * @param faults faults with pointers from the same root
 * @param save pointers whose faults do not count
 */
export function holds(
  pointer: string,
  faults: readonly PointerFault[],
  save: readonly string[] = [],
): boolean {
  return !faults.some(
    (f) => !save.includes(f.pointer) && (f.pointer === pointer || f.pointer.startsWith(`${pointer}/`)),
  );
}

/** Library names of a section, each looked up whatever else is wrong. */
function conductorFaults(
  section: Record<string, unknown>,
  at: string,
  library: ConductorLibrary,
  bySchema: readonly PointerFault[],
) {
  const conductors = section['conductors'];
  if (!isObject(conductors)) return [];
  return Object.entries(conductors).flatMap(([key, value]) => {
    const pointer = `${at}/conductors/${pointerToken(key)}`;
    // Of a library conductor its name alone decides; a missing temperature is another fault.
    if (!isObject(value) || typeof value['library'] !== 'string' || !holds(`${pointer}/library`, bySchema))
      return [];
    return libraryFaults(value as Conductor, pointer, library);
  });
}

/** Phases and conductors of a section's positions, when each of them says what it is. */
function geometryFaults(
  section: Record<string, unknown>,
  at: string,
  bySchema: readonly PointerFault[],
): PointerFault[] {
  const { conductors, positions } = section;
  if (!isObject(conductors) || !Array.isArray(positions)) return [];
  // Which phase a position is of, and on what it hangs, must be known of each; its figures need not hold.
  const known = positions.every((p, i) => {
    const own = `${at}/positions/${i}`;
    return (
      isObject(p) &&
      ['', '/circuit', '/phase', '/conductor', '/groundWire'].every(
        (f) => !bySchema.some((b) => b.pointer === own + f),
      )
    );
  });
  return known ? sectionRuleFaults({ conductors, positions } as unknown as Section, at) : [];
}

/**
 * Faults of rules within a line that does not hold by schema.
 * @param json the line as it came
 * @param bySchema its faults by schema, pointers from the line
 * @param library the conductor library
 */
export function partialRuleFaults(
  json: unknown,
  bySchema: readonly PointerFault[],
  library: ConductorLibrary,
): PointerFault[] {
  const sections = isObject(json) ? json['sections'] : undefined;
  if (!Array.isArray(sections) || !bySchema.every((f) => f.pointer !== '/sections')) return [];
  return sections.flatMap((section: unknown, i) => {
    const at = `/sections/${i}`;
    if (!isObject(section)) return [];
    return [...conductorFaults(section, at, library, bySchema), ...geometryFaults(section, at, bySchema)];
  });
}
