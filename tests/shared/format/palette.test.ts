import { describe, expect, it } from 'vitest';
import {
  cssVariables,
  DARK,
  GROUND_TOKENS,
  LIGHT,
  LINE_TOKENS,
  TEXT_TOKENS,
  type ColourToken,
  type Palette,
} from '#shared/format/palette';

/** Linear-light red, green and blue of a six-digit sRGB hex colour (IEC 61966-2-1's curve). */
function linear(hex: string): [number, number, number] {
  const channel = (at: number) => {
    const c = parseInt(hex.slice(at, at + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  };
  return [channel(1), channel(3), channel(5)];
}

/** Relative luminance, WCAG 2.2 (https://www.w3.org/TR/WCAG22/#dfn-relative-luminance). */
function luminance(hex: string): number {
  const [r, g, b] = linear(hex);
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Contrast ratio, WCAG 2.2 (https://www.w3.org/TR/WCAG22/#dfn-contrast-ratio). */
function contrast(a: string, b: string): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((x, y) => y - x) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

/** Hue in degrees of OKLab, whose matrices CSS Color 4 gives (https://www.w3.org/TR/css-color-4/#ok-lab). */
function hue(hex: string): number {
  const [r, g, b] = linear(hex);
  const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
  const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
  const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
  const greenRed = 1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s;
  const blueYellow = 0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s;
  return (Math.atan2(blueYellow, greenRed) * 180) / Math.PI;
}

const themes: [string, Palette][] = [
  ['light', LIGHT],
  ['dark', DARK],
];

/** Pairs of a foreground and a ground that stay below a bar, as readable text. */
function below(palette: Palette, tokens: readonly ColourToken[], bar: number): string[] {
  return tokens.flatMap((token) =>
    GROUND_TOKENS.map((ground) => ({ token, ground, ratio: contrast(palette[token], palette[ground]) }))
      .filter(({ ratio }) => ratio < bar)
      .map(({ ground, ratio }) => `${token} on ${ground}: ${ratio.toFixed(2)}`),
  );
}

describe('contrast arithmetic', () => {
  it('gives 21:1 for black on white and 4.54:1 for the grey that the guidelines call the limit', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 10);
    expect(contrast('#767676', '#FFFFFF')).toBeCloseTo(4.54, 2);
  });
});

describe.each(themes)('%s theme', (_name, palette) => {
  it('sets every text colour at 4.5:1 or better on every ground', () => {
    expect(below(palette, TEXT_TOKENS, 4.5)).toEqual([]);
  });

  it('draws every line, mark and border at 3:1 or better on every ground', () => {
    expect(below(palette, LINE_TOKENS, 3)).toEqual([]);
  });

  it('sees a pair that falls short', () => {
    expect(below(palette, ['rule'], 3).length).toBeGreaterThan(0);
  });

  it('sets the words on the primary action, also when it is hovered, at 4.5:1 or better', () => {
    expect(contrast(palette['on-copper'], palette.copper)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(palette['on-copper'], palette['copper-deep'])).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps brand, alarm and question 23° of hue or more apart', () => {
    const hues = [palette.vermilion, palette.copper, palette.ochre].map(hue);
    for (const [i, a] of hues.entries())
      for (const b of hues.slice(i + 1)) {
        const apart = Math.abs(a - b);
        expect(Math.min(apart, 360 - apart)).toBeGreaterThanOrEqual(23);
      }
  });
});

describe('css variables', () => {
  it('names each token once, the same in both themes', () => {
    const light = cssVariables(LIGHT);
    expect(Object.keys(light)).toEqual(Object.keys(cssVariables(DARK)));
    expect(light['--copper-wash']).toBe(LIGHT['copper-wash']);
  });
});
