import type { BandDraft, SaveBandDraftRequest } from '#shared/contracts/api.generated';
import { toleranceRows, uncertaintyRows } from '../../../lib/rule-words';

/** One figure of the rules beside the bands: where it stands in the draft, its words and the factor it is shown by. */
export interface SettingField {
  /** Place in the draft, such as `tolerances/x1/relative`. */
  place: string;
  label: string;
  unit: string;
  /** Shown value of one unit of the kept value. */
  scale: number;
  value: number;
  /** A count of days. */
  whole?: boolean;
}

export interface SettingGroup {
  title: string;
  aside: string;
  fields: readonly SettingField[];
}

const NAMES: Readonly<Record<string, string>> = {
  r1: 'R1',
  x1: 'X1',
  b1: 'B1',
  r0: 'R0',
  x0: 'X0',
  b0: 'B0',
  r0m: 'R0m',
  x0m: 'X0m',
  b0m: 'B0m',
};

const UNITS = { m: ['± m', 1], K: ['± K', 1], share: ['± %', 100], factor: ['× or ÷', 1] } as const;

function toleranceFields(draft: BandDraft): SettingField[] {
  return toleranceRows(draft.tolerances).flatMap(({ parameter, relative, cap }) => {
    const name = NAMES[parameter] ?? parameter;
    const field = (key: string, label: string, value: number): SettingField => ({
      place: `tolerances/${parameter}/${key}`,
      label,
      unit: '%',
      scale: 100,
      value,
    });
    return [
      field('relative', `${name}, tolerance`, relative),
      field('cap', `${name}, widened to at most`, cap),
    ];
  });
}

/** Everything that a draft holds beside its bands, in the groups of the page. */
export function settingGroups(draft: BandDraft): SettingGroup[] {
  const { owner, windows } = draft;
  return [
    {
      title: 'Tolerances',
      aside: 'How far a declared value may part from the recomputed one',
      fields: toleranceFields(draft),
    },
    {
      title: 'Inputs',
      aside: 'How exactly each is taken to be known',
      fields: uncertaintyRows(draft.uncertainties).map(({ key, label, unit, value }) => ({
        place: `uncertainties/${key}`,
        label,
        unit: UNITS[unit][0],
        scale: UNITS[unit][1],
        value,
      })),
    },
    {
      title: 'The owner’s assumptions and windows',
      aside: 'Where nothing is filed; working days of each step',
      fields: [
        {
          place: 'owner/baseMva',
          label: 'Base of per-unit values',
          unit: 'MVA',
          scale: 1,
          value: owner.baseMva,
        },
        {
          place: 'owner/earthResistivityOhmM',
          label: 'Earth resistivity',
          unit: 'Ω m',
          scale: 1,
          value: owner.earthResistivityOhmM,
        },
        {
          place: 'windows/take-up',
          label: 'To take a case up',
          unit: 'working days',
          scale: 1,
          value: windows['take-up'],
          whole: true,
        },
        {
          place: 'windows/review',
          label: 'To review',
          unit: 'working days',
          scale: 1,
          value: windows.review,
          whole: true,
        },
        {
          place: 'windows/cure',
          label: 'To answer a letter',
          unit: 'working days',
          scale: 1,
          value: windows.cure,
          whole: true,
        },
      ],
    },
  ];
}

/** A setting as its field shows it. */
export const settingText = ({ value, scale }: Pick<SettingField, 'value' | 'scale'>): string =>
  String(Number((value * scale).toPrecision(12)));

/** Reads a field of a setting: a number above zero, whole where days are counted; null for anything else. */
export function readSetting(text: string, { scale, whole }: SettingField): number | null {
  const trimmed = text.trim();
  if (!(whole ? /^\d+$/ : /^\d+(\.\d+)?$/).test(trimmed)) return null;
  const value = Number((Number(trimmed) / scale).toPrecision(12));
  return value > 0 ? value : null;
}

export type SettingEdits = Readonly<Record<string, string>>;

/** What is wrong with what was typed, by place. */
export function settingFaults(groups: readonly SettingGroup[], edits: SettingEdits): Record<string, string> {
  const fields = groups.flatMap((g) => g.fields);
  const faults = fields.flatMap((field) => {
    const typed = edits[field.place];
    if (typed === undefined || readSetting(typed, field) !== null) return [];
    return [[field.place, field.whole ? 'Write a whole number of days.' : 'Write a number above zero.']];
  });
  return Object.fromEntries(faults) as Record<string, string>;
}

/** The parts of a draft that were typed over, as a request takes them; each part is sent whole. */
export function settingParts(
  draft: BandDraft,
  edits: SettingEdits,
): Pick<SaveBandDraftRequest, 'tolerances' | 'uncertainties' | 'owner' | 'windows'> {
  const next = structuredClone({
    tolerances: draft.tolerances,
    uncertainties: draft.uncertainties,
    owner: draft.owner,
    windows: draft.windows,
  }) as Record<string, Record<string, unknown>>;
  const touched = new Set<string>();
  for (const field of settingGroups(draft).flatMap((g) => g.fields)) {
    const typed = edits[field.place];
    const value = typed === undefined ? null : readSetting(typed, field);
    if (value === null) continue;
    const [part = '', key = '', inner] = field.place.split('/');
    touched.add(part);
    const target = inner === undefined ? next[part] : (next[part]?.[key] as Record<string, unknown>);
    if (target) target[inner ?? key] = value;
  }
  return Object.fromEntries(Object.entries(next).filter(([part]) => touched.has(part)));
}

/** The figures that differ from those in force, with what was typed over them. */
export function changedSettings(
  groups: readonly SettingGroup[],
  edits: SettingEdits,
  inForce: ReadonlyMap<string, number>,
): { place: string; text: string }[] {
  return groups
    .flatMap((g) => g.fields)
    .flatMap((field) => {
      const now = inForce.get(field.place);
      const value =
        edits[field.place] === undefined ? field.value : readSetting(edits[field.place] ?? '', field);
      if (now === undefined || value === null || value === now) return [];
      const shown = (v: number) => settingText({ value: v, scale: field.scale });
      return [
        { place: field.place, text: `${field.label}: ${shown(value)} ${field.unit}, now ${shown(now)}` },
      ];
    });
}
