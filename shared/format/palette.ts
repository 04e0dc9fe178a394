/**
 * The one palette of the product. Everything that has a colour takes it from here: the screen
 * through the CSS variables that tailwind.config.ts emits, paper and PDF directly. No other file
 * holds a colour; tests/architecture looks for strays.
 *
 * The names say what a colour stands for, not what it looks like, save the metals of a line that
 * the product's look is built on (copper, its green patina, steel).
 */

/** The name of a colour, as used in CSS (`var(--copper-wash)`) and in class names (`bg-copper-wash`). */
export type ColourToken =
  | 'paper'
  | 'sheet'
  | 'ink'
  | 'ink-soft'
  | 'rule'
  | 'rule-strong'
  | 'copper'
  | 'copper-deep'
  | 'copper-wash'
  | 'on-copper'
  | 'verdigris'
  | 'verdigris-wash'
  | 'ochre'
  | 'ochre-wash'
  | 'vermilion'
  | 'vermilion-wash'
  | 'steel'
  | 'steel-wash'
  | 'band'
  | 'band-edge'
  | 'focus';

/** One theme: a six-digit sRGB hex value for every token. */
export type Palette = Readonly<Record<ColourToken, string>>;

/** Light theme; also the theme of everything on paper, whatever the screen shows. */
export const LIGHT: Palette = {
  paper: '#F7F5F0',
  sheet: '#FFFFFF',
  ink: '#1C2628',
  'ink-soft': '#56646A',
  rule: '#D9D4C8',
  'rule-strong': '#858279',
  copper: '#9F4818',
  'copper-deep': '#83390F',
  'copper-wash': '#F6E7DD',
  'on-copper': '#FFFFFF',
  verdigris: '#1F6F63',
  'verdigris-wash': '#E1F0EC',
  ochre: '#7F6000',
  'ochre-wash': '#FBF3DC',
  vermilion: '#B3142C',
  'vermilion-wash': '#FCEAE8',
  steel: '#3E5C76',
  'steel-wash': '#E6EDF3',
  band: '#E6E1D3',
  'band-edge': '#8A856F',
  focus: '#3E5C76',
};

/** Dark theme, by the system's preference or by the switch in the top bar. */
export const DARK: Palette = {
  paper: '#14191A',
  sheet: '#1C2325',
  ink: '#E9E6DF',
  'ink-soft': '#A5B0B3',
  rule: '#343E40',
  'rule-strong': '#7A8688',
  copper: '#E39560',
  'copper-deep': '#F0AC7E',
  'copper-wash': '#38291F',
  'on-copper': '#1A1410',
  verdigris: '#6CC3B2',
  'verdigris-wash': '#183430',
  ochre: '#DDB84F',
  'ochre-wash': '#352C14',
  vermilion: '#FF8F8A',
  'vermilion-wash': '#422326',
  steel: '#98BAD7',
  'steel-wash': '#20303D',
  band: '#37403F',
  'band-edge': '#85908B',
  focus: '#98BAD7',
};

/** Tokens that text is set in on paper, on sheets and on every wash: each must reach 4.5:1 there. */
export const TEXT_TOKENS = ['ink', 'ink-soft', 'copper', 'verdigris', 'ochre', 'vermilion', 'steel'] as const;

/** Tokens that lines, marks and field borders are drawn in: each must reach 3:1 on the same grounds. */
export const LINE_TOKENS = [...TEXT_TOKENS, 'rule-strong', 'band-edge', 'focus'] as const;

/** The grounds that text and lines stand on. */
export const GROUND_TOKENS = [
  'paper',
  'sheet',
  'copper-wash',
  'verdigris-wash',
  'ochre-wash',
  'vermilion-wash',
  'steel-wash',
] as const;

/**
 * A palette as CSS custom properties.
 * @param palette one theme
 * @returns `{ '--paper': '#…', … }`, in the palette's order
 */
export function cssVariables(palette: Palette): Record<string, string> {
  return Object.fromEntries(Object.entries(palette).map(([token, value]) => [`--${token}`, value]));
}
