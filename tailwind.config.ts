import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';
import { cssVariables, DARK, LIGHT, type ColourToken } from './shared/format/palette';

const tokens = Object.keys(LIGHT) as ColourToken[];
const colours = Object.fromEntries(tokens.map((token) => [token, `var(--${token})`]));

/** Emits both themes; the dark one for screens only, so that paper is always light. */
const themes = plugin(({ addBase }) => {
  const light = { 'color-scheme': 'light', ...cssVariables(LIGHT) };
  const dark = { 'color-scheme': 'dark', ...cssVariables(DARK) };
  addBase({
    ':root': light,
    '@media screen and (prefers-color-scheme: dark)': { ':root:not([data-theme="light"])': dark },
    '@media screen': { ':root[data-theme="dark"]': dark },
  });
});

/**
 * Widths from which a layout holds; below them it folds. On screens only: an A4 page is 794 px wide
 * and must not fold.
 */
const widths = plugin(({ addVariant }) => {
  addVariant('field', '@media print, (width >= 720px)');
  addVariant('table', '@media print, (width >= 1080px)');
  addVariant('cols', '@media print, (width >= 1180px)');
  addVariant('full', '@media print, (width >= 1400px)');
});

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  darkMode: ['selector', '[data-theme="dark"]'],
  theme: {
    // Replaced whole, not extended: what is not a token cannot be named.
    colors: { transparent: 'transparent', current: 'currentColor', inherit: 'inherit', ...colours },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    boxShadow: {},
    dropShadow: {},
    backgroundImage: {},
    fontFamily: {
      sans: ['"Public Sans Variable"', '"Counterpoise Symbols"', 'system-ui', 'sans-serif'],
      mono: ['ui-monospace', '"Liberation Mono"', 'Menlo', 'Consolas', 'monospace'],
    },
    fontSize: {
      axis: ['11px', '14px'],
      label: ['12px', '16px'],
      table: ['13px', '18px'],
      control: ['14px', '20px'],
      base: ['15px', '22px'],
      h3: ['15px', '22px'],
      h2: ['18px', '24px'],
      h1: ['22px', '28px'],
      count: ['32px', '36px'],
      figure: ['40px', '44px'],
    },
    fontWeight: { normal: '400', medium: '550', semibold: '600', strong: '650', bold: '700' },
    screens: {},
    extend: {
      maxWidth: { page: '1344px', prose: '62ch' },
      height: { bar: '52px', row: '36px' },
    },
  },
  plugins: [themes, widths],
} satisfies Config;
