/** What must hold within a line and no schema can say. Pointers count from the line. */
import { inWords, shown } from '../contracts/faults';
import type { PointerFault } from '../contracts/faults';
import type { FilingLine, Section } from '../contracts/filing.generated';
import { didYouMean } from '../contracts/nearest';
import { circuitsOfLine, circuitsOfSection } from './circuits';

const PHASES = ['a', 'b', 'c'] as const;

const list = (items: readonly (string | number)[]) => items.join(', ');

const fault = (pointer: string, value: unknown, expected: string, message: string): PointerFault => ({
  pointer,
  value: shown(value),
  expected,
  message,
});

/** Every position names a conductor of its section. */
function positionConductors(s: Section, at: string): PointerFault[] {
  const keys = Object.keys(s.conductors ?? {});
  return (s.positions ?? []).flatMap((p, i) => {
    if (keys.includes(p.conductor)) return [];
    const hint = didYouMean(p.conductor, keys) || (keys.length > 0 ? ` It has ${list(keys)}.` : '');
    const message = `This section has no conductor ${inWords(p.conductor)}.${hint}`;
    const expected = keys.length > 0 ? `one of ${list(keys)}` : 'a key of the section’s conductors';
    return [fault(`${at}/positions/${i}/conductor`, p.conductor, expected, message)];
  });
}

/** Each circuit has phases a, b and c once. */
function phases(s: Section, at: string): PointerFault[] {
  if (!s.positions) return [];
  const seen = new Map<string, number>();
  const faults: PointerFault[] = [];
  s.positions.forEach((p, i) => {
    if (p.groundWire) return;
    const key = `${p.circuit}${p.phase}`;
    const first = seen.get(key);
    if (first === undefined) seen.set(key, i);
    else {
      const where = `positions ${first + 1} and ${i + 1}`;
      const message = `Circuit ${p.circuit} has phase ${p.phase} twice (${where}).`;
      faults.push(fault(`${at}/positions/${i}/phase`, p.phase, 'each phase of a circuit once', message));
    }
  });
  for (const circuit of circuitsOfSection(s) ?? []) {
    const lacking = PHASES.filter((p) => !seen.has(`${circuit}${p}`));
    if (lacking.length > 0)
      faults.push(
        fault(
          `${at}/positions`,
          s.positions,
          'phases a, b and c of each circuit',
          `Circuit ${circuit} lacks phase ${list(lacking)}.`,
        ),
      );
  }
  return faults;
}

/** A section with positions has at least one circuit, numbered from 1, the same as the rest of the line. */
function sectionCircuits(s: Section, at: string, ofLine: readonly number[]): PointerFault[] {
  const place = s.positions ? `${at}/positions` : `${at}/perLength`;
  const own = circuitsOfSection(s);
  if (!own) {
    const message = 'There are ground wires here and no phase.';
    return s.positions ? [fault(place, s.positions, 'phases a, b and c of circuit 1', message)] : [];
  }
  if (own.some((n, i) => n !== i + 1)) {
    const message = `Circuits are numbered from 1; here ${list(own)} stands.`;
    return [fault(place, list(own), 'circuits numbered from 1', message)];
  }
  if (list(own) === list(ofLine)) return [];
  const message = `This section has circuits ${list(own)}, the first one that has any has ${list(ofLine)}. A stretch with other circuits is a line of its own.`;
  return [fault(place, list(own), `circuits ${list(ofLine)}`, message)];
}

/** A cable's list of values names each circuit once. */
function cableEntries(s: Section, at: string): PointerFault[] {
  if (!Array.isArray(s.perLength)) return [];
  const numbers = s.perLength.map((v) => v.circuit);
  return numbers.flatMap((n, i) =>
    numbers.indexOf(n) === i
      ? []
      : [fault(`${at}/perLength/${i}/circuit`, n, 'each circuit once', `Circuit ${n} is there twice.`)],
  );
}

/** Declared entries stand for circuits of the line, each once. */
function declaredCircuits(line: FilingLine, ofLine: readonly number[]): PointerFault[] {
  const numbers = line.declared.map((d) => d.circuit);
  return numbers.flatMap((n, i) => {
    const at = `/declared/${i}/circuit`;
    if (numbers.indexOf(n) !== i)
      return [fault(at, n, 'one entry a circuit', `Circuit ${n} is declared twice.`)];
    if (ofLine.includes(n)) return [];
    const message = `Values are declared for circuit ${n}; the structure carries circuit ${list(ofLine)} only.`;
    return [fault(at, n, `one of ${list(ofLine)}`, message)];
  });
}

/** A declared coupling is between two circuits of the line. */
function mutualCircuits(line: FilingLine, ofLine: readonly number[]): PointerFault[] {
  return (line.declaredMutual ?? []).flatMap((m, i) => {
    const missing = m.circuits.filter((n) => !ofLine.includes(n));
    if (missing.length === 0) return [];
    const message = `A coupling is declared with circuit ${list(missing)}, which the structure does not carry.`;
    return [fault(`/declaredMutual/${i}/circuits`, list(m.circuits), `two of ${list(ofLine)}`, message)];
  });
}

/**
 * Faults of a section in itself beyond its schema.
 * @param s a section whose conductors and positions hold by schema
 * @param at JSON Pointer of the section
 */
export function sectionRuleFaults(s: Section, at: string): PointerFault[] {
  return [...positionConductors(s, at), ...phases(s, at), ...cableEntries(s, at)];
}

/**
 * Faults of a line beyond its schema.
 * @param line a line that holds by schema
 * @returns faults with pointers from the line
 */
export function lineRuleFaults(line: FilingLine): PointerFault[] {
  const ofLine = circuitsOfLine(line);
  const ofSections = line.sections.flatMap((s, i) => {
    const at = `/sections/${i}`;
    return [...sectionRuleFaults(s, at), ...sectionCircuits(s, at, ofLine)];
  });
  return [...ofSections, ...declaredCircuits(line, ofLine), ...mutualCircuits(line, ofLine)];
}
