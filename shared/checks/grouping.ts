import type { LooseFinding, LooseFindings } from './apply-rules';
import type { LineMatters } from './causes/find-causes';
import type { Matter } from './causes/solve-problem';
import { MADE_OF } from './parameters';
import type { FindingParameter } from './parameters';
import type { Cause, Finding } from './types';

/** The findings of a line with their groups and causes. */
export interface GroupedFindings {
  line: Finding[];
  circuits: Finding[][];
  pairs: Finding[][];
}

const UNEXPLAINED_WORDS = ' None of the slips that people usually make explains it.';

/** Where a finding belongs: its group, and the matter that explains it. */
interface Place {
  group: number;
  matter: Matter | null;
}

/** Hands out group numbers; slips in the geometry are one matter over all circuits of the line. */
class Groups {
  private last = 0;
  private readonly known = new Map<string, number>();

  next(): number {
    this.last += 1;
    return this.last;
  }

  of(cause: Cause | undefined): number {
    if (cause === undefined || cause.in === 'declared') return this.next();
    const key = JSON.stringify([cause.code, cause.where, cause.corrected]);
    const group = this.known.get(key) ?? this.next();
    this.known.set(key, group);
    return group;
  }
}

/**
 * Joins findings that one matter explains and hangs the causes on them.
 *
 * @param loose what the rules said
 * @param matters the slips that explain it
 * @param lineCauses causes of a geometry that cannot be computed
 * @param wereSought whether causes were sought: what none explains says so
 */
export function groupFindings(
  loose: LooseFindings,
  matters: LineMatters,
  lineCauses: readonly Cause[],
  wereSought: boolean,
): GroupedFindings {
  const groups = new Groups();
  const circuits = loose.circuits.map((found, index) =>
    groupOne(found, matters.circuits[index] ?? [], groups, wereSought),
  );
  const pairs = loose.pairs.map((found, index) =>
    groupOne(found, matters.pairs[index] ?? [], groups, wereSought),
  );
  const line = loose.line.map((finding): Finding => ({
    ...finding,
    group: groups.next(),
    causes: isUncomputed(finding) ? [...lineCauses] : [],
  }));
  return { line, circuits, pairs };
}

const UNCOMPUTED = new Set([
  'drawing.coincident-wires',
  'drawing.overlapping-wires',
  'drawing.wire-in-ground',
  'drawing.not-computable',
]);

/** True for a finding that says why a geometry cannot be computed. */
export function isUncomputed({ code }: { code: string }): boolean {
  return UNCOMPUTED.has(code);
}

function groupOne(
  found: readonly LooseFinding[],
  matters: readonly Matter[],
  groups: Groups,
  wereSought: boolean,
): Finding[] {
  const byParameter = new Map<FindingParameter, Place>();
  for (const matter of matters) {
    const group = groups.of(matter.causes[0]);
    for (const parameter of matter.explains) byParameter.set(parameter, { group, matter });
  }
  // Without geometry it is bands and wave speed that show a slip in the constants that they are made of.
  const possiblePlace = (parameter: FindingParameter): Place | undefined =>
    MADE_OF[parameter]
      .map((part) => byParameter.get(part))
      .find((place) => place?.matter?.causes[0]?.possible === true);
  const placeOf = (parameter: FindingParameter | undefined): Place => {
    const place =
      parameter === undefined ? undefined : (byParameter.get(parameter) ?? possiblePlace(parameter));
    const own = place ?? { group: groups.next(), matter: null };
    if (parameter !== undefined) byParameter.set(parameter, own);
    return own;
  };
  // Leaders first, so that those that follow find the group of what they follow.
  const placed = new Map<LooseFinding, Place>();
  for (const finding of [...found].sort((a, b) => rank(a) - rank(b))) {
    placed.set(finding, placeOf(rootOf(finding, found)));
  }
  return found.map((finding): Finding => {
    const { group, matter } = placed.get(finding) ?? { group: groups.next(), matter: null };
    const isOpen =
      wereSought && matter === null && finding.family === 'geometry' && finding.grade === 'must-answer';
    return {
      ...finding,
      message: isOpen ? finding.message + UNEXPLAINED_WORDS : finding.message,
      group,
      causes: finding.follows === undefined ? causesFor(finding, matter) : [],
    };
  });
}

function rank(finding: LooseFinding): number {
  return finding.follows === undefined ? 0 : 1;
}

/** The parameter at the end of a chain of findings that follow one another. */
function rootOf(finding: LooseFinding, all: readonly LooseFinding[]): FindingParameter | undefined {
  let parameter = finding.follows ?? finding.parameter;
  for (let step = 0; step < all.length; step++) {
    const leader = all.find((other) => other.parameter === parameter);
    if (leader?.follows === undefined || leader.follows === parameter) break;
    parameter = leader.follows;
  }
  return parameter;
}

function causesFor({ parameter, family, grade }: LooseFinding, matter: Matter | null): Cause[] {
  if (matter === null || parameter === undefined || grade === 'note') return [];
  const causes = matter.causes.filter((cause) =>
    cause.possible === true
      ? MADE_OF[parameter].some((part) => cause.explains.includes(part))
      : cause.explains.some((explained) => explained === parameter),
  );
  const isPossible = causes[0]?.possible === true;
  return family === 'geometry' || family === 'physics' || (isPossible && family === 'typical') ? causes : [];
}
