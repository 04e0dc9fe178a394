import type {
  ConductorData,
  GroundWirePosition,
  OverheadSection,
  PhasePosition,
} from '../../../engine/index';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, overheadSections, sectionPointer } from './variant';

type Position = PhasePosition | GroundWirePosition;
type Field = 'horizontalM' | 'attachmentHeightM' | 'sagM' | 'bundleSpacingM';
type Dimension = 'diameterMm' | 'gmrMm' | 'coreDiameterMm';

const FEET = 0.3048;

/** Sets of fields that are typed in one unit. */
const FIELD_SETS: readonly { fields: readonly Field[]; words: string; prior: number }[] = [
  {
    fields: ['horizontalM', 'attachmentHeightM', 'sagM', 'bundleSpacingM'],
    words: 'all dimensions of the structure',
    prior: -0.7,
  },
  { fields: ['horizontalM', 'attachmentHeightM', 'sagM'], words: 'offsets, heights and sags', prior: -0.7 },
  { fields: ['horizontalM', 'attachmentHeightM'], words: 'offsets and heights', prior: -1 },
  { fields: ['attachmentHeightM', 'sagM'], words: 'heights and sags', prior: -1 },
  { fields: ['attachmentHeightM'], words: 'heights', prior: -1 },
  { fields: ['horizontalM'], words: 'offsets', prior: -1 },
  { fields: ['sagM'], words: 'sags', prior: -1.3 },
  { fields: ['bundleSpacingM'], words: 'bundle spacings', prior: -1 },
];

/** Lengths in metres beyond which another unit comes to mind; below them nobody has typed it. */
const BEYOND_METRES = {
  'centimetres-for-metres': { horizontalM: 60, attachmentHeightM: 150, sagM: 60, bundleSpacingM: 2 },
  'feet-for-metres': { horizontalM: 0, attachmentHeightM: 15, sagM: 0, bundleSpacingM: 0.65 },
} as const;

const UNITS: readonly { code: keyof typeof BEYOND_METRES; factor: number; unit: string }[] = [
  { code: 'feet-for-metres', factor: FEET, unit: 'feet' },
  { code: 'centimetres-for-metres', factor: 0.01, unit: 'centimetres' },
];

/** Feet or centimetres in fields that take metres, over the usual sets of fields, section by section and in all. */
export function lengthUnitSlips(context: VariantContext): Variant[] {
  const sections = overheadSections(context);
  const groups = sections.length > 1 ? [sections, ...sections.map((one) => [one])] : [sections];
  return groups.flatMap((group) =>
    UNITS.flatMap(({ code, factor, unit }) =>
      FIELD_SETS.flatMap(({ fields, words, prior }): Variant[] => {
        const indices = new Set(group.map(({ index }) => index));
        const limits: Readonly<Record<Field, number>> = BEYOND_METRES[code];
        const isLikely = group.some(({ section }) => isBeyond(section, fields, limits));
        if (!isLikely) return [];
        const outcome = context.bench.changed((section, index) =>
          indices.has(index) ? scaled(section, fields, factor) : null,
        );
        const first = group[0];
        if (outcome === null || first === undefined) return [];
        const place = {
          where: group.length === 1 ? sectionPointer(context, first.index) : context.line.pointer,
        };
        const corrected =
          group.length === 1 ? entries(first.section, fields, factor) : entriesOf(group, fields, factor);
        const common = { in: 'geometry', model: ENGINE_MODEL, freedom: 0 } as const;
        return [{ ...common, ...place, code, outcome, corrected, prior, words: `${words} are in ${unit}` }];
      }),
    ),
  );
}

/** True when every one of the fields is too large somewhere to be in metres. */
function isBeyond(
  section: OverheadSection,
  fields: readonly Field[],
  limits: Readonly<Record<Field, number>>,
): boolean {
  return fields.every((field) =>
    section.positions.some((position) => Math.abs(fieldOf(position, field) ?? 0) > limits[field]),
  );
}

function scaled(section: OverheadSection, fields: readonly Field[], factor: number): OverheadSection | null {
  let touched = false;
  const positions = section.positions.map((position): Position => {
    const changes: Partial<Record<Field, number>> = {};
    for (const field of fields) {
      const value = fieldOf(position, field);
      if (value !== undefined && value !== 0) changes[field] = value * factor;
    }
    if (Object.keys(changes).length === 0) return position;
    touched = true;
    return { ...position, ...changes };
  });
  return touched ? { ...section, positions } : null;
}

function fieldOf(position: Position, field: Field): number | undefined {
  if (field === 'bundleSpacingM') return position.kind === 'phase' ? position.bundleSpacingM : undefined;
  return position[field];
}

/** The corrected entries of several sections, named from the line. */
function entriesOf(
  group: readonly { section: OverheadSection; index: number }[],
  fields: readonly Field[],
  factor: number,
): Record<string, number> {
  const named = group.flatMap(({ section, index }) =>
    Object.entries(entries(section, fields, factor)).map(([key, value]) => [
      `sections/${index}/${key}`,
      value,
    ]),
  );
  return Object.fromEntries(named) as Record<string, number>;
}

function entries(section: OverheadSection, fields: readonly Field[], factor: number): Record<string, number> {
  const found: Record<string, number> = {};
  section.positions.forEach((position, index) => {
    for (const field of fields) {
      const value = fieldOf(position, field);
      if (value !== undefined && value !== 0) found[`positions/${index}/${field}`] = value * factor;
    }
  });
  return found;
}

const DIMENSION_SETS: readonly { dimensions: readonly Dimension[]; words: string }[] = [
  { dimensions: ['diameterMm', 'gmrMm', 'coreDiameterMm'], words: 'diameter and GMR' },
  { dimensions: ['diameterMm', 'gmrMm'], words: 'diameter and GMR' },
  { dimensions: ['diameterMm', 'coreDiameterMm'], words: 'the diameter' },
  { dimensions: ['diameterMm'], words: 'the diameter' },
  { dimensions: ['gmrMm'], words: 'the GMR' },
];

/** Inches in conductor fields that take millimetres. */
export function inchSlips(context: VariantContext): Variant[] {
  const kinds = [['phase'], ['ground-wire'], ['phase', 'ground-wire']] as const;
  return kinds.flatMap((kind) =>
    DIMENSION_SETS.flatMap(({ dimensions, words }): Variant[] => {
      const outcome = context.bench.changed((section) => inInches(section, kind, dimensions));
      if (outcome === null) return [];
      const place = conductorPlace(context, kind[0], dimensions);
      const common = {
        code: 'inches-for-millimetres',
        in: 'geometry',
        model: ENGINE_MODEL,
        freedom: 0,
      } as const;
      return [
        {
          ...common,
          ...place,
          outcome,
          prior: -1 - Math.log(3),
          words: `${words} of the ${kind.length === 2 ? 'conductors' : kind[0] === 'phase' ? 'phase conductor' : 'ground wire'} ${dimensions.includes('gmrMm') && dimensions.length > 1 ? 'are' : 'is'} in inches`,
        },
      ];
    }),
  );
}

function inInches(
  section: OverheadSection,
  kinds: readonly Position['kind'][],
  dimensions: readonly Dimension[],
): OverheadSection | null {
  let touched = false;
  const positions = section.positions.map((position): Position => {
    if (!kinds.includes(position.kind)) return position;
    const conductor: ConductorData = { ...position.conductor };
    if (!isSameUnit(conductor, dimensions)) return position;
    for (const dimension of dimensions) {
      const value = conductor[dimension];
      if (value === undefined) continue;
      conductor[dimension] = value * 25.4;
      touched = true;
    }
    return { ...position, conductor };
  });
  return touched ? { ...section, positions } : null;
}

/** A core or a GMR thicker than a diameter in inches is in millimetres itself; a thinner core goes with the diameter. */
function isSameUnit(conductor: ConductorData, dimensions: readonly Dimension[]): boolean {
  if (!dimensions.includes('diameterMm')) return true;
  const { coreDiameterMm = 0, gmrMm = 0, diameterMm, model } = conductor;
  if (dimensions.includes('gmrMm') && (model === 'tube' || gmrMm >= diameterMm)) return false;
  return dimensions.includes('coreDiameterMm') === coreDiameterMm < diameterMm;
}

function conductorPlace(
  context: VariantContext,
  kind: Position['kind'],
  dimensions: readonly Dimension[],
): { where: string; corrected: Record<string, number> } {
  const first = overheadSections(context)[0];
  const at = first?.section.positions.findIndex((position) => position.kind === kind) ?? -1;
  const position = first?.section.positions[at];
  if (first === undefined || position === undefined) return { where: context.line.pointer, corrected: {} };
  const filed = context.line.sheet.line.sections[first.index] as
    { positions?: { conductor: string }[] } | undefined;
  const key = filed?.positions?.[at]?.conductor ?? '';
  const corrected: Record<string, number> = {};
  for (const dimension of dimensions) {
    const value = position.conductor[dimension];
    if (value !== undefined) corrected[dimension] = value * 25.4;
  }
  return { where: `${sectionPointer(context, first.index)}/conductors/${escape(key)}`, corrected };
}

/** A key as a JSON Pointer writes it. */
function escape(key: string): string {
  return key.replaceAll('~', '~0').replaceAll('/', '~1');
}
