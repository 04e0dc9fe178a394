import { changeSection, groundWiresOf, setCircuits } from './edit';
import type { LineForm, SectionForm } from './form-types';

/** A change of the form that brings back what another one took away; what was typed since stays. */
export type Back = (form: LineForm) => LineForm;

/** Brings a removed section back to its place. */
export const backSection =
  (before: LineForm, index: number): Back =>
  (form) => {
    const section = before.sections[index];
    return section ? { ...form, sections: form.sections.toSpliced(index, 0, section) } : form;
  };

function secondCircuit(section: SectionForm, before: SectionForm | undefined): SectionForm {
  if (!before) return section;
  const isSecond = (p: SectionForm['positions'][number]): boolean => p.kind === 'phase' && p.circuit === 2;
  const second = before.positions.filter(isSecond);
  const first = section.positions.filter((p) => p.kind === 'phase' && p.circuit === 1);
  const [own] = section.perLength;
  const [, other] = before.perLength;
  return {
    ...section,
    conductors: { ...before.conductors, ...section.conductors },
    positions: [...first, ...second, ...groundWiresOf(section)],
    perLength: own && other ? [own, other] : section.perLength,
  };
}

/** Brings the second circuit back: its positions, its declared values, those of its cables. */
export const backCircuit =
  (before: LineForm): Back =>
  (form) => {
    const two = setCircuits(form, 2);
    const second = before.declared.filter((d) => d.circuit === 2);
    // A circuit alone on its line could be the second one only: then the first was never declared.
    const first = before.declared.some((d) => d.circuit === 1)
      ? two.declared.filter((d) => d.circuit === 1)
      : [];
    return {
      ...two,
      declared: [...first, ...second],
      sections: two.sections.map((s, i) => secondCircuit(s, before.sections[i])),
    };
  };

/** Brings the declared values of a circuit back that was said to be somebody else's. */
export const backDeclared =
  (before: LineForm, circuit: number): Back =>
  (form) => {
    const own = before.declared.filter((d) => d.circuit === circuit);
    const others = form.declared.filter((d) => d.circuit !== circuit);
    return { ...form, declared: [...others, ...own].sort((a, b) => a.circuit - b.circuit) };
  };

/** Brings the ground wires back that a section had more of. */
export const backGroundWires =
  (before: SectionForm, index: number): Back =>
  (form) =>
    changeSection(form, index, (s) => {
      const gone = groundWiresOf(before).slice(groundWiresOf(s).length);
      return {
        ...s,
        conductors: { ...before.conductors, ...s.conductors },
        positions: [...s.positions, ...gone],
      };
    });

/** Brings the positions back that a structure was filled over. */
export const backPositions =
  (before: SectionForm, index: number): Back =>
  (form) =>
    changeSection(form, index, (s) => ({ ...s, positions: before.positions }));
