/** The canonical text of a filing, of which its content hash is taken: RFC 8785 over the values in SI. */
import type { Conductor, FilingLine, Position, Section } from '../contracts/filing.generated';
import type { DeclaredValue, NormalisedFiling, NormalisedLine, NormalisedSection } from './types';

/**
 * JSON after RFC 8785 (JCS): keys in the order of their UTF-16 units, no blanks, numbers as ECMAScript writes them.
 * @param value plain data; undefined members are left out
 * @returns the text
 * @throws Error on a number that JSON has no form for
 */
export function canonicalJson(value: unknown): string {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new Error(`canonical JSON has no form for ${value}`);
    return JSON.stringify(value);
  }
  if (value === null || typeof value !== 'object') return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  const rows = Object.entries(value)
    .filter(([, v]) => v !== undefined)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([k, v]) => `${JSON.stringify(k)}:${canonicalJson(v)}`);
  return `{${rows.join(',')}}`;
}

/** SI value of a declared quantity: per length (Ω/km, µS/km) or of the whole line (Ω, µS). */
function declaredSi(values: Readonly<Partial<Record<string, DeclaredValue>>>): Record<string, unknown> {
  const rows = Object.entries(values).flatMap(([key, v]) => {
    return v ? [[key, { form: v.form, value: v.form === 'whole-line' ? v.total : v.perKm }]] : [];
  });
  return Object.fromEntries(rows) as Record<string, unknown>;
}

/** A position with its conductor's data in place of the key, which is only a word of the file. */
function placed(p: Position, conductors: Readonly<Record<string, Conductor>>): Record<string, unknown> {
  const { bundleSpacingM, ...rest } = p;
  const spacing = (p.bundleCount ?? 1) > 1 ? { bundleSpacingM } : {};
  return { ...rest, ...spacing, conductor: conductors[p.conductor] };
}

/** Phases by circuit and letter, then ground wires by what they are: the order in the file means nothing. */
function inOrder(positions: readonly Position[], conductors: Readonly<Record<string, Conductor>>) {
  const ranked = positions.map((p) => {
    const value = placed(p, conductors);
    return { value, rank: p.groundWire ? `~${canonicalJson(value)}` : `${p.circuit}${p.phase}` };
  });
  ranked.sort((a, b) => (a.rank < b.rank ? -1 : a.rank > b.rank ? 1 : 0));
  return ranked.map((r) => r.value);
}

/** A section: geometry with its data in place, a cable by its values in SI. */
function section(s: Section, normalised: NormalisedSection | undefined): Record<string, unknown> {
  const { conductors, positions, perLength: _perLength, ...rest } = s;
  if (normalised?.kind === 'cable') return { ...rest, perLength: normalised.input.perLength };
  if (!conductors || !positions) return rest;
  return { ...rest, positions: inOrder(positions, conductors) };
}

/** A line as it is hashed: declared values in SI and in the order of their circuits. */
function canonicalLine(line: NormalisedLine): Record<string, unknown> {
  const filed: FilingLine = line.sheet.line;
  const { sections, declared: _declared, declaredMutual: _mutual, ...rest } = filed;
  const circuits = [...line.circuits].sort((a, b) => a.circuit - b.circuit);
  return {
    ...rest,
    sections: sections.map((s, i) => section(s, line.sections[i])),
    declared: circuits.map(({ pointer: _pointer, declared, ratings, ...more }) => ({
      ...more,
      ...declaredSi(declared),
      ...(ratings.length ? { ratings } : {}),
    })),
    ...(line.mutual.length
      ? { declaredMutual: line.mutual.map((m) => ({ circuits: m.circuits, ...declaredSi(m.declared) })) }
      : {}),
  };
}

/**
 * The canonical text of one line: what its content hash is taken of.
 * @param line a line that was read
 */
export function canonicalLineText(line: NormalisedLine): string {
  return canonicalJson(canonicalLine(line));
}

/**
 * The canonical text of a filing: what its content hash is taken of. Two files that say the same in other units of
 * the same value, in another order of keys or with defaults written out have the same text.
 * @param filing a filing that was read
 */
export function canonicalFilingText(filing: NormalisedFiling): string {
  return canonicalJson({ format: 'filing/1', lines: filing.lines.map(canonicalLine) });
}
