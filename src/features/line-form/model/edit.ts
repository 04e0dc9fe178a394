import {
  PHASES,
  blankConductor,
  blankDeclared,
  blankGroundWire,
  blankPhase,
  blankSection,
  blankSequence,
} from './blank';
import type { FormPath, GroundWireForm, LineForm, PhaseForm, SectionForm } from './form-types';

/** The tree with one leaf replaced; everything beside the path keeps its identity. */
export function setAt<T>(tree: T, path: FormPath, value: unknown): T {
  const [head, ...rest] = path;
  if (head === undefined) return value as T;
  if (Array.isArray(tree)) {
    const copy: unknown[] = [...(tree as unknown[])];
    copy[Number(head)] = setAt(copy[Number(head)], rest, value);
    return copy as T;
  }
  const object = tree as Record<string, unknown>;
  return { ...object, [head]: setAt(object[head], rest, value) } as T;
}

/** What stands at a path of the tree, or undefined. */
export function getAt(tree: unknown, path: FormPath): unknown {
  return path.reduce<unknown>(
    (node, step) => (typeof node === 'object' && node !== null ? (node as never)[step] : undefined),
    tree,
  );
}

export function changeSection(
  form: LineForm,
  index: number,
  change: (section: SectionForm) => SectionForm,
): LineForm {
  return { ...form, sections: form.sections.map((s, i) => (i === index ? change(s) : s)) };
}

export const phasesOf = (section: SectionForm): PhaseForm[] =>
  section.positions.filter((p): p is PhaseForm => p.kind === 'phase');

export const groundWiresOf = (section: SectionForm): GroundWireForm[] =>
  section.positions.filter((p): p is GroundWireForm => p.kind === 'ground-wire');

/** The unit that a section's positions are written in; the first position speaks for all. */
export const heightUnit = (section: SectionForm): string =>
  section.positions[0]?.attachmentHeightM.unit ?? 'm';

function circuitsIn(section: SectionForm, circuits: 1 | 2): SectionForm {
  const phases = phasesOf(section);
  const first = phases.filter((p) => p.circuit === 1);
  const second = phases.filter((p) => p.circuit === 2);
  const model = first[0];
  const added = PHASES.map((p): PhaseForm => {
    const blank = blankPhase(2, p, heightUnit(section));
    if (!model) return blank;
    const { conductor, bundleCount, bundleSpacingM } = model;
    return { ...blank, conductor, bundleCount, bundleSpacingM };
  });
  const kept = circuits === 1 ? [] : second.length > 0 ? second : added;
  const perLength =
    circuits === 1 ? section.perLength.slice(0, 1) : [...section.perLength, blankSequence()].slice(0, 2);
  return { ...section, positions: [...first, ...kept, ...groundWiresOf(section)], perLength };
}

/** One circuit or two on every section; a second one starts with the first one's conductors. */
export function setCircuits(form: LineForm, circuits: 1 | 2): LineForm {
  const own = form.declared.filter((d) => d.circuit <= circuits);
  const missing = circuits === 2 && !own.some((d) => d.circuit === 2) ? [blankDeclared(2)] : [];
  const declared = [...own, ...missing];
  return {
    ...form,
    circuits,
    sections: form.sections.map((s) => circuitsIn(s, circuits)),
    declared: declared.length > 0 ? declared : [blankDeclared(1)],
  };
}

/** Whether a circuit's values are declared here, or the circuit is somebody else's. */
export function setDeclares(form: LineForm, circuit: number, declares: boolean): LineForm {
  const others = form.declared.filter((d) => d.circuit !== circuit);
  if (!declares) return others.length > 0 ? { ...form, declared: others } : form;
  const all = [...others, blankDeclared(circuit)];
  return { ...form, declared: all.sort((a, b) => a.circuit - b.circuit) };
}

export function addSection(form: LineForm): LineForm {
  const last = form.sections.at(-1);
  const copied: SectionForm = last
    ? { ...structuredClone(last), lengthKm: { text: '', unit: last.lengthKm.unit } }
    : blankSection(form.circuits);
  return { ...form, sections: [...form.sections, copied] };
}

export function removeSection(form: LineForm, index: number): LineForm {
  return form.sections.length > 1 ? { ...form, sections: form.sections.filter((_, i) => i !== index) } : form;
}

/** As many ground wires as asked for (0 to 4); the first ones stay as they are. */
export function setGroundWires(section: SectionForm, count: number): SectionForm {
  const present = groundWiresOf(section);
  const conductor = present[0]?.conductor ?? 'ground';
  const unit = heightUnit(section);
  const wires = Array.from(
    { length: count },
    (_, i): GroundWireForm => present[i] ?? { ...blankGroundWire(unit), conductor },
  );
  const conductors =
    count > 0 && !section.conductors[conductor]
      ? { ...section.conductors, [conductor]: blankConductor() }
      : section.conductors;
  return { ...section, conductors, positions: [...phasesOf(section), ...wires] };
}

/** One bundle for every phase of the section. */
export function setBundle(
  section: SectionForm,
  bundle: Partial<Pick<PhaseForm, 'bundleCount' | 'bundleSpacingM'>>,
): SectionForm {
  return {
    ...section,
    positions: section.positions.map((p) => (p.kind === 'phase' ? { ...p, ...bundle } : p)),
  };
}

/** States the unit of all positions of a section; the texts stay as they were typed. */
export function setHeightUnit(section: SectionForm, unit: string): SectionForm {
  const positions = section.positions.map((p) => ({
    ...p,
    horizontalM: { ...p.horizontalM, unit },
    attachmentHeightM: { ...p.attachmentHeightM, unit },
    sagM: { ...p.sagM, unit },
  }));
  return { ...section, positions };
}

/** Gives one position a conductor of its own, under a key that the section does not use yet. */
export function addConductor(section: SectionForm, position: number): SectionForm {
  const at = section.positions[position];
  if (!at) return section;
  const base = at.kind === 'phase' ? 'phase' : 'ground';
  let n = 2;
  while (section.conductors[`${base} ${n}`]) n += 1;
  const key = `${base} ${n}`;
  return {
    ...section,
    conductors: { ...section.conductors, [key]: blankConductor() },
    positions: section.positions.map((p, i) => (i === position ? { ...p, conductor: key } : p)),
  };
}
