import type { HandCheck, ShortcutCause, ShortcutValue } from '#shared/engine/index';
import { figure, quantity } from '#shared/format/numbers';

/** One step that a reader with a calculator follows: what, how, and what it comes to. */
export interface HandStep {
  what: string;
  how: string;
  result: string;
}

const m = (value: number, digits = 4) => quantity(value, 'm', digits);

/** The shortcut's steps in the order in which they are taken. */
export function handSteps(check: HandCheck): HandStep[] {
  const { spacingsM, bundleCount: n, frequencyHz: hz } = check;
  const bundled = n > 1;
  const root = ['', '', '√', '∛', '∜'][n] ?? `${n}√`;
  const product = bundled ? ` · ${figure(check.bundleProduct, 4)}` : '';
  return [
    { what: 'Spacing a–b', how: 'between bundle centres at average height', result: m(spacingsM.ab) },
    { what: 'Spacing b–c', how: 'the same', result: m(spacingsM.bc) },
    { what: 'Spacing c–a', how: 'the same', result: m(spacingsM.ca) },
    { what: 'GMD', how: '∛(ab · bc · ca)', result: m(check.gmdM) },
    {
      what: 'Radius and GMR of one conductor',
      how: check.gmrSource === 'tabled' ? 'GMR as filed' : 'GMR = r · e^(−¼), a solid wire',
      result: `${m(check.radiusM)}, ${m(check.gmrM)}`,
    },
    ...(bundled
      ? [
          {
            what: `Bundle of ${n}`,
            how: `product of the distances to the others, side ${figure(check.bundleSpacingM, 4)} m`,
            result: figure(check.bundleProduct, 4),
          },
          { what: 'GMR of the bundle', how: `${root}(GMR${product})`, result: m(check.bundleGmrM) },
          { what: 'Radius of the bundle', how: `${root}(r${product})`, result: m(check.bundleRadiusM) },
        ]
      : []),
    {
      what: 'L',
      how: `0.2 · ln(${figure(check.gmdM, 4)} ÷ ${figure(check.bundleGmrM, 4)})`,
      result: quantity(check.inductanceMilliHenryPerKm, 'mH/km', 4),
    },
    {
      what: 'C',
      how: `2π · ε₀ ÷ ln(${figure(check.gmdM, 4)} ÷ ${figure(check.bundleRadiusM, 4)})`,
      result: quantity(check.capacitanceNanofaradPerKm, 'nF/km', 4),
    },
    { what: 'X1', how: `2π · ${hz} · L`, result: quantity(check.x1.shortcut, 'Ω/km', 4) },
    { what: 'B1', how: `2π · ${hz} · C`, result: quantity(check.b1.shortcut, 'µS/km', 4) },
    {
      what: 'R1',
      how: bundled ? `resistance of one conductor ÷ ${n}` : 'resistance of the conductor',
      result: quantity(check.r1.shortcut, 'Ω/km', 4),
    },
  ];
}

const CAUSE_WORDS: Readonly<Record<ShortcutCause, string>> = {
  bundle: 'bundle and phases as they hang',
  earth: 'earth and images',
  'ground-wires': 'ground wires',
  'other-circuits': 'other circuit',
};

export interface ShortcutRow {
  name: string;
  unit: string;
  value: ShortcutValue;
  /** Where the difference comes from, the largest first: "earth and images +0.0002". */
  because: string;
}

const SMALLEST_SHARE = 1e-4;

function because({ causes, full }: ShortcutValue): string {
  const told = causes
    .filter((c) => Math.abs(c.difference) > Math.abs(full) * SMALLEST_SHARE)
    .sort((a, b) => Math.abs(b.difference) - Math.abs(a.difference));
  if (told.length === 0) return 'nothing worth naming';
  return told
    .map((c) => `${CAUSE_WORDS[c.cause]} ${c.difference > 0 ? '+' : ''}${figure(c.difference, 2)}`)
    .join(', ');
}

/** The shortcut beside the full method, with the difference split by its causes. */
export function shortcutRows(check: HandCheck): ShortcutRow[] {
  const row = (name: string, unit: string, value: ShortcutValue) => ({
    name,
    unit,
    value,
    because: because(value),
  });
  return [row('R1', 'Ω/km', check.r1), row('X1', 'Ω/km', check.x1), row('B1', 'µS/km', check.b1)];
}
