/** Which circuits a line has: by its positions, else by its cable's values, else by what is declared. */
import type { FilingLine, Section } from '../contracts/filing.generated';

/** Numbers of the circuits that a section's positions or cable values name, ascending; null when it names none. */
export function circuitsOfSection(section: Section): number[] | null {
  const numbers =
    section.positions?.map((p) => p.circuit) ??
    (Array.isArray(section.perLength) ? section.perLength.map((v) => v.circuit) : []);
  const found = new Set(numbers.filter((n): n is number => n !== undefined));
  return found.size > 0 ? [...found].sort((a, b) => a - b) : null;
}

/** Numbers of the circuits on the line's structure, ascending. */
export function circuitsOfLine(line: FilingLine): number[] {
  for (const section of line.sections) {
    const own = circuitsOfSection(section);
    if (own) return own;
  }
  const most = Math.max(...line.declared.map((d) => d.circuit));
  return Array.from({ length: most }, (_, i) => i + 1);
}
